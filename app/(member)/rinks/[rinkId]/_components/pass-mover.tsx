// Changing one pass: earlier or later, thinner or thicker, other water. All passes after it follow at once, by the same model.
'use client'
import { useEffect, useEffectEvent, useMemo } from 'react'
import useSWR from 'swr'
import { readerOf } from '@/components/rinks/reader'
import { Button } from '@/components/ui/button'
import { unpackNight } from '@/lib/advice/night-model'
import { nightModelKey } from '@/lib/cache-keys/outlook'
import { fetchJson } from '@/lib/http/fetch-json'
import type { MovableNight, TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import { layerText } from '@/lib/words/quantities'
import { waterSourceText } from '@/lib/words/pass'
import { clockText } from '@/lib/words/times'
import { movePass, stepsOf, type Move } from './moved-passes'

interface PassMoverProps {
  view: TonightView
  passes: TonightPass[]
  number: number
  onMove: (passes: TonightPass[]) => void
}

export default function PassMover(props: PassMoverProps) {
  const { rink, night, outlook } = props.view
  const key = nightModelKey(rink.id, night.date, outlook?.judgedAt ?? '')
  const { data, error } = useSWR<MovableNight, Error>(key, fetchJson<MovableNight>, { revalidateOnFocus: false })
  if (data) return <Mover {...props} movable={data} />
  return (
    <p role="status" className="flex min-h-[208px] items-center text-note text-graphite">
      {error ? 'Tonight’s model could not be fetched. Try again with a connection.' : 'Fetching tonight’s model…'}
    </p>
  )
}

function Mover({ view, passes, number, onMove, movable }: PassMoverProps & { movable: MovableNight }) {
  const night = useMemo(() => unpackNight(movable.model), [movable])
  const reader = readerOf(view)
  const pass = passes.find((one) => one.number === number)
  const moved = (by: Move) => movePass({ night, movable, passes, number, by })
  // The first judgement in a browser takes three times as long as any after it: it is made before the first tap.
  const warmUp = useEffectEvent(() => moved({ minutes: 0 }))
  useEffect(() => {
    const timer = setTimeout(warmUp, 0)
    return () => clearTimeout(timer)
  }, [])
  if (!pass) return null
  const move = (by: Move) => onMove(moved(by))
  const steps = stepsOf(pass, view)
  return (
    <div role="group" aria-label={`Change pass ${number}`} className="mt-3 grid gap-3 print:hidden">
      <Stepper name="Start" value={clockText(pass.startsAt, reader)}>
        <Button disabled={!steps.earlier} onClick={() => move({ minutes: -15 })}>
          Earlier
        </Button>
        <Button disabled={!steps.later} onClick={() => move({ minutes: 15 })}>
          Later
        </Button>
      </Stepper>
      <Stepper name="Layer" value={layerText(pass.layerMm, reader)}>
        <Button disabled={!steps.thinner} onClick={() => move({ layerMm: -0.5 })}>
          Thinner
        </Button>
        <Button disabled={!steps.thicker} onClick={() => move({ layerMm: 0.5 })}>
          Thicker
        </Button>
      </Stepper>
      <fieldset className="flex flex-wrap gap-x-5">
        <legend className="text-note text-graphite">Water</legend>
        {movable.waters.map((water) => (
          <label
            key={`${water.kind} ${water.temperatureC} ${water.flowLPerMin}`}
            className="flex min-h-touch cursor-pointer items-center gap-2"
          >
            <input
              type="radio"
              name={`water-${number}`}
              className="size-5 accent-ink"
              checked={water.temperatureC === pass.temperatureC && water.flowLPerMin === pass.flowLPerMin}
              onChange={() => move({ water })}
            />
            {waterSourceText(water, reader)}
          </label>
        ))}
      </fieldset>
    </div>
  )
}

function Stepper({ name, value, children }: { name: string; value: string; children: React.ReactNode }) {
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
      <p className="w-[112px]" aria-live="polite">
        <span className="block text-note text-graphite">{name}</span>
        <span className="font-medium">{value}</span>
      </p>
      {children}
    </div>
  )
}
