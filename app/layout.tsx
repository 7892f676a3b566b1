// Html shell. Pages are rendered per request, because each gets its own CSP nonce (proxy.ts) and its reader's theme.
import type { Metadata, Viewport } from 'next'
import { connection } from 'next/server'
import type { ReactNode } from 'react'
import { LightChanges } from '@/components/theme/light-changes'
import { readPageTheme } from '@/lib/auth/page-theme'
import './globals.css'
import { typeface } from './typeface'

export const metadata: Metadata = {
  title: { default: 'Nightsheet', template: '%s · Nightsheet' },
  description: 'When to fill, when to flood and when to hold off, for keepers of outdoor ice rinks.',
}

/** The tokens of paper (globals.css), for what the browser draws round the page. */
const PAPER = { light: '#f6f3ec', dark: '#0f161d' }

export async function generateViewport(): Promise<Viewport> {
  const { theme } = await readPageTheme()
  return {
    width: 'device-width',
    initialScale: 1,
    themeColor: theme
      ? PAPER[theme]
      : [
          { media: '(prefers-color-scheme: light)', color: PAPER.light },
          { media: '(prefers-color-scheme: dark)', color: PAPER.dark },
        ],
  }
}

export default async function RootLayout({ children }: { children: ReactNode }) {
  await connection()
  const { theme, changes } = await readPageTheme()
  return (
    <html lang="en" data-theme={theme} className={typeface.variable}>
      <body className="font-sans text-body">
        {children}
        <LightChanges theme={theme} changes={changes} />
      </body>
    </html>
  )
}
