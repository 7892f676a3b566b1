// The door: one narrow column, the name above it.
import Link from 'next/link'
import type { ReactNode } from 'react'

export default function AccountLayout({ children }: { children: ReactNode }) {
  return (
    <div className="mx-auto max-w-[30rem] px-5 pb-24">
      <header className="border-b border-rule pt-2">
        <Link href="/" className="inline-flex min-h-touch items-center font-semibold no-underline">
          Nightsheet
        </Link>
      </header>
      <main>{children}</main>
    </div>
  )
}
