// Lets the browser install Nightsheet; notifications on some phones need that.
import type { MetadataRoute } from 'next'

export default function manifest(): MetadataRoute.Manifest {
  return {
    name: 'Nightsheet',
    short_name: 'Nightsheet',
    description: 'When to fill, when to flood and when to hold off, for keepers of outdoor ice rinks.',
    start_url: '/rinks',
    scope: '/',
    display: 'standalone',
    background_color: '#0f161d',
    theme_color: '#0f161d',
    icons: [
      { src: '/icon.svg', sizes: 'any', type: 'image/svg+xml', purpose: 'any' },
      { src: '/icon.svg', sizes: 'any', type: 'image/svg+xml', purpose: 'maskable' },
    ],
  }
}
