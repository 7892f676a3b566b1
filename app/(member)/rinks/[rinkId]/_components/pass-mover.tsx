// Changing one pass: earlier or later, thinner or thicker, other water. All passes after it follow at once, by the same model.
'use client'
import { useMemo, useState } from 'react'
import useSWR from 'swr'
import { readerOf } from '@/components/rinks/reader'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { unpackNight } from '@/lib/advice/night-model'
import { nightModelKey } from '@/lib/cache-keys/outlook'
import { fetchJson } from '@/lib/http/fetch-json'
import { IDLE } from '@/lib/http/form-state'
import type { MovableNight, TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import { layerText } from '@/lib/words/quantities'
import { waterSourceText } from '@/lib/words/pass'
import { clockText } from '@/lib/words/times'
import { keepOwnPassesAction } from '../actions'
import { movePass, stepsOf, withKept, type Move } from './moved-passes'
import type { ChangeView } from './use-tonight'

interface PassMoverProps {
  view: TonightView
  passes: TonightPass[]
  number: number
  change: ChangeView
  onMove: (passes: TonightPass[] | null) => void
  onClose: () => void
}

export default function PassMover(props: PassMoverProps) {
  const { rink, night, outlook } = props.view
  const key = nightModelKey(rink.id, night.date, outlook?.judgedAt ?? '')
  const { data, error } = useSWR<MovableNight, Error>(key, fetchJson<MovableNight>, { revalidateOnFocus: false })
  if (data) return <Mover {...props} movable={data} />
  return (
    <div className="flex min-h-[208px] flex-col justify-center gap-2 text-note text-graphite">
      <p role="status">
        {error ? 'Tonight’s model could not be fetched. Try again with a connection.' : 'Fetching tonight’s model…'}
      </p>
      {error ? <Button onClick={props.onClose}>Close</Button> : null}
    </div>
  )
}

function Mover({ view, passes, number, change, onMove, onClose, movable }: PassMoverProps & { movable: MovableNight }) {
  const night = useMemo(() => unpackNight(movable.model), [movable])
  const [fault, setFault] = useState<string | null>(null)
  const reader = readerOf(view)
  const pass = passes.find((one) => one.number === number)
  if (!pass) return null
  const move = (by: Move) => onMove(movePass({ night, movable, passes, number, by }))
  const steps = stepsOf(pass, view)

  async function keep() {
    const shown = withKept(view, passes)
    const fields = new FormData()
    fields.set('rinkId', view.rink.id)
    fields.set('nightDate', view.night.date)
    fields.set('passes', JSON.stringify(steps.kept(passes)))
    const message = await change(() => keepOwnPassesAction(IDLE, fields), shown)
    if (message === null) onClose()
    else setFault(message)
  }

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
          <label key={`${water.kind} ${water.temperatureC} ${water.flowLPerMin}`} className="flex min-h-touch cursor-pointer items-center gap-2">
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
      {fault ? (
        <Notice tone="caution" live>
          {fault}
        </Notice>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <Button look="main" onClick={keep}>
          Keep this plan
        </Button>
        <Button onClick={onClose}>Leave it as it was</Button>
      </div>
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
