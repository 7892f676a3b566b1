// The frame of a page that anybody may read: the way home, a title, and the other help pages at its foot.
import Link from 'next/link'
import type { ReactNode } from 'react'
import { HelpLinks } from '@/app/_components/help-links'
import { PageFrame } from '@/components/ui/page-frame'

export function HelpPage({ title, lead, children }: { title: string; lead: string; children: ReactNode }) {
  return (
    <PageFrame>
      <p>
        <Link href="/" className="inline-flex min-h-touch items-center font-semibold no-underline hover:underline">
          Nightsheet
        </Link>
      </p>
      <h1 className="mt-4 mb-3 max-w-[26ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">{title}</h1>
      <p className="mb-7 max-w-line text-graphite">{lead}</p>
      {children}
      <HelpLinks />
    </PageFrame>
  )
}
