// Lets the browser install Nightsheet; notifications on some phones need that. The pictures are drawn from icon.svg.
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
      { src: '/icon-192.png', sizes: '192x192', type: 'image/png', purpose: 'any' },
      { src: '/icon-512.png', sizes: '512x512', type: 'image/png', purpose: 'any' },
      // The bars lie within the middle four fifths, which every shape of icon shows.
      { src: '/icon-512.png', sizes: '512x512', type: 'image/png', purpose: 'maskable' },
    ],
    shortcuts: [{ name: 'My rinks tonight', url: '/rinks' }],
  }
}
