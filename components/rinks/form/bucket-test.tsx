// The bucket test: how long the hose takes to fill a known bucket. With script there is a stopwatch to tap.
'use client'
import { useEffect, useState } from 'react'
import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { parseNumber, scaleOf, typed, unitOf } from '@/lib/schemas/measures'
import type { RinkForm } from './use-rink-form'

const TICK_MILLIS = 100

/** The flow in the person's units, undefined while a number is missing. */
function flowText({ values, units }: RinkForm): string | undefined {
  const size = parseNumber(values.bucketSize ?? '')
  const seconds = parseNumber(values.bucketSeconds ?? '')
  if (!size || !seconds || size < 0 || seconds < 0) return undefined
  return typed('flow', units, (scaleOf('bucket', units).toSi(size) / seconds) * 60)
}

export function BucketTest({ form }: { form: RinkForm }) {
  const isHydrated = useHydrated()
  const flow = flowText(form)
  const unit = unitOf('flow', form.units)
  return (
    <>
      <p className="mb-3 max-w-line text-note text-graphite">
        Open the tap as for a flood, let the hose run into a bucket whose size you know, and time it until full.
      </p>
      <div className="grid grid-cols-2 gap-4">
        <TextField label="Bucket" inputMode="decimal" {...form.text('bucketSize')} />
        <TextField label="Time to fill" inputMode="decimal" {...form.text('bucketSeconds')} unit="s" />
      </div>
      {isHydrated ? (
        <div className="mb-5 flex flex-wrap items-center gap-3">
          <Stopwatch onStop={(seconds) => form.set({ bucketSeconds: seconds })} />
          {flow ? <Button onClick={() => form.set({ flow })}>{`Use ${flow} ${unit}`}</Button> : null}
        </div>
      ) : (
        <p className="mb-5 text-note text-graphite">Leave the flow above empty to have it worked out from these two.</p>
      )}
    </>
  )
}

function Stopwatch({ onStop }: { onStop: (seconds: string) => void }) {
  const [startedAt, setStartedAt] = useState<number>()
  const [now, setNow] = useState(0)
  useEffect(() => {
    if (startedAt === undefined) return
    const timer = setInterval(() => setNow(performance.now()), TICK_MILLIS)
    return () => clearInterval(timer)
  }, [startedAt])
  if (startedAt === undefined) {
    const start = () => {
      setNow(performance.now())
      setStartedAt(performance.now())
    }
    return <Button onClick={start}>Start the stopwatch</Button>
  }
  const stop = () => {
    onStop(((performance.now() - startedAt) / 1000).toFixed(1))
    setStartedAt(undefined)
  }
  return (
    <Button look="main" onClick={stop} className="min-w-[12rem]">
      Stop: <span aria-hidden="true">{Math.max(0, (now - startedAt) / 1000).toFixed(1)} s</span>
    </Button>
  )
}
