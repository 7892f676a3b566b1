'use client'
// The frame of every page broke, so this one brings its own.
import './globals.css'
import { typeface } from './typeface'
import { Button } from '@/components/ui/button'

export default function GlobalError({ retry }: { retry: () => void }) {
  return (
    <html lang="en" className={typeface.variable}>
      <body className="font-sans text-body">
        <title>Nightsheet</title>
        <main className="mx-auto max-w-page px-5 pt-7">
          <h1 className="mb-2 text-verdict font-medium tracking-tight">Nightsheet broke on our side</h1>
          <p className="mb-6 max-w-line text-graphite">Nothing that you stored is lost. Try again in a few minutes.</p>
          <Button look="main" onClick={retry}>
            Try again
          </Button>
        </main>
      </body>
    </html>
  )
}
