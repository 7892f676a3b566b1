// When the page of a rink breaks: what happened, and a way on.
'use client'
import { Button, ButtonLink } from '@/components/ui/button'
import { PageFrame } from '@/components/ui/page-frame'

export default function RinkError({ error, retry }: { error: Error & { digest?: string }; retry: () => void }) {
  return (
    <PageFrame>
      <h1 className="mb-2 max-w-[24ch] text-verdict font-medium lg:text-verdict-wide">This page broke on our side.</h1>
      <p className="mb-5 max-w-line">
        Nothing you saved is lost. Try once more; if it breaks again, wait a few minutes.
      </p>
      {error.digest ? (
        <p className="mb-5 text-note text-graphite">For a report, the fault has the number {error.digest}.</p>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <Button look="main" onClick={retry}>
          Try again
        </Button>
        <ButtonLink href="/rinks">My rinks</ButtonLink>
      </div>
    </PageFrame>
  )
}
