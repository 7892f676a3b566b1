// Html shell. Pages are rendered per request, because each gets its own CSP nonce (proxy.ts).
import type { Metadata, Viewport } from 'next'
import { connection } from 'next/server'
import type { ReactNode } from 'react'
import './globals.css'

export const metadata: Metadata = {
  title: { default: 'Nightsheet', template: '%s · Nightsheet' },
  description: 'When to fill, when to flood and when to hold off, for keepers of outdoor ice rinks.',
}

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#f6f3ec' },
    { media: '(prefers-color-scheme: dark)', color: '#0f161d' },
  ],
}

export default async function RootLayout({ children }: { children: ReactNode }) {
  await connection()
  return (
    <html lang="en">
      <body className="font-sans text-body">{children}</body>
    </html>
  )
}
