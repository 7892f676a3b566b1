// The typeface, served by us: asked for with the page, and stood in for by one of the same measures, so that no line moves.
import localFont from 'next/font/local'

export const typeface = localFont({
  variable: '--font-plex-sans',
  display: 'swap',
  adjustFontFallback: 'Arial',
  src: [
    { path: '../node_modules/@fontsource/ibm-plex-sans/files/ibm-plex-sans-latin-400-normal.woff2', weight: '400' },
    { path: '../node_modules/@fontsource/ibm-plex-sans/files/ibm-plex-sans-latin-500-normal.woff2', weight: '500' },
    { path: '../node_modules/@fontsource/ibm-plex-sans/files/ibm-plex-sans-latin-600-normal.woff2', weight: '600' },
  ],
})
