// The place of a chart, which comes once it is nearly in view. Whoever cannot see or fetch it has the table below it.
'use client'
import { useRef } from 'react'
import { useNearViewport } from '@/components/hooks/use-near-viewport'
import { usePart, type LoadPart } from '@/components/hooks/use-part'

interface ChartFrameProps<P> {
  load: LoadPart<P>
  /** What the chart is drawn from. */
  chart: P
  /** Its height, kept from the start so that nothing moves. */
  className: string
}

export function ChartFrame<P extends object>({ load, chart, className }: ChartFrameProps<P>) {
  const frame = useRef<HTMLDivElement>(null)
  const { Part, hasFailed } = usePart(load, useNearViewport(frame))
  return (
    <div ref={frame} aria-hidden="true" className={className}>
      {Part ? <Part {...chart} /> : null}
      {hasFailed ? (
        <p className="text-note text-graphite">The chart could not be fetched. The table has its numbers.</p>
      ) : null}
    </div>
  )
}
