// The model comes to the browser only when a pass is to be changed.
'use client'
import type { ComponentProps } from 'react'
import { usePart } from '@/components/hooks/use-part'
import { Button } from '@/components/ui/button'
import type Mover from './pass-mover'

const load = () => import('./pass-mover')

export function PassMover(props: ComponentProps<typeof Mover>) {
  const { Part, hasFailed, fetchPart } = usePart(load)
  if (Part) return <Part {...props} />
  return (
    <div role="status" className="flex min-h-[208px] flex-wrap items-center gap-x-4 text-note text-graphite">
      {hasFailed ? (
        <>
          <p>Tonight’s model could not be fetched. The plan stays as it was.</p>
          <Button onClick={() => void fetchPart()}>Try again</Button>
        </>
      ) : (
        <p>Fetching tonight’s model…</p>
      )}
    </div>
  )
}
