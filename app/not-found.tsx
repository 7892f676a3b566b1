// An address that leads nowhere, or nowhere for this person.
import type { Metadata } from 'next'
import { ButtonLink } from '@/components/ui/button'
import { PageFrame } from '@/components/ui/page-frame'

export const metadata: Metadata = { title: 'Not found' }

export default function NotFoundPage() {
  return (
    <PageFrame>
      <h1 className="mb-2 text-verdict font-medium tracking-tight">There is nothing here for you</h1>
      <p className="mb-6 max-w-line text-graphite">
        The address may be mistyped, or belong to a rink that you are not on. If somebody sent it to you, ask them to
        add you.
      </p>
      <ButtonLink href="/rinks" look="main">
        Go to your rinks
      </ButtonLink>
    </PageFrame>
  )
}
