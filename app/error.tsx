'use client'
// Something broke while a page was made. The digest finds the cause in our logs.
import { Button } from '@/components/ui/button'
import { PageFrame } from '@/components/ui/page-frame'

export default function ErrorPage({ error, retry }: { error: Error & { digest?: string }; retry: () => void }) {
  return (
    <PageFrame>
      <h1 className="mb-2 text-verdict font-medium tracking-tight">This page broke on our side</h1>
      <p className="mb-6 max-w-line text-graphite">
        Nothing that you stored is lost. Try again; if it stays like this, come back in a few minutes.
      </p>
      <Button look="main" onClick={retry}>
        Try again
      </Button>
      {error.digest ? (
        <p className="mt-6 text-small text-graphite">For the people who look after this server: {error.digest}</p>
      ) : null}
    </PageFrame>
  )
}
