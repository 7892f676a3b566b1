// The frame of one account page, with the way back to the others.
import type { Route } from 'next'
import Link from 'next/link'
import type { ReactNode } from 'react'
import { PageFrame } from '@/components/ui/page-frame'

export function AccountFrame({ title, children }: { title: string; children: ReactNode }) {
  return (
    <PageFrame>
      <div className="max-w-[34rem]">
        <Link href={'/account' as Route} className="inline-flex min-h-touch items-center text-note underline">
          Your account
        </Link>
        <h1 className="mt-1 mb-2 text-verdict font-medium tracking-tight">{title}</h1>
        {children}
      </div>
    </PageFrame>
  )
}
