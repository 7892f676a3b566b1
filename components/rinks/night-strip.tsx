// The night strip of one rink: drawing, hours to open, legend, and the same numbers as a table.
'use client'
import { useMemo, useState } from 'react'
import { useHydrated } from '../hooks/use-hydrated'
import { layOutNightStrip } from '../charts/night-strip-layout'
import { NightStripDrawing } from '../charts/night-strip-drawing'
import { StripHours } from '../charts/strip-hours'
import { HourPanel } from './hour-panel'
import { NightLegend } from './night-legend'
import { NightTable } from './night-table'
import { readerOf } from './reader'
import { clockText } from '@/lib/words/times'
import { hoursOfNight, stripHours, stripInput, type StripSize, type StripSource } from './strip-input'
import { stripWords } from './strip-words'

const SHOWN: Record<StripSize, string> = {
  wide: 'relative hidden min-[720px]:block print:block',
  narrow: 'relative min-[720px]:hidden print:hidden',
}

export function NightStrip({ source, now }: { source: StripSource; now: number }) {
  const [selected, setSelected] = useState<number | null>(null)
  const isHydrated = useHydrated()
  const { reader, hours, drawn, figures } = useMemo(() => prepare(source, now), [source, now])
  const present = drawn.findIndex((hour) => hour.startsAt + 3_600_000 > now)
  return (
    <figure className="-mx-5 border-y border-rule bg-sheet pt-3 lg:mx-0 lg:border-x print:mx-0 print:border-x">
      {figures.map(({ size, layout, words }) => (
        <div key={size} className={SHOWN[size]}>
          <NightStripDrawing id={`strip-${size}`} layout={layout} words={words} />
          {isHydrated ? (
            <StripHours
              layout={layout}
              label="Hours of the night"
              nameOf={(index) => clockText(hours[index]?.time ?? source.night.startsAt, reader)}
              selected={selected}
              start={Math.max(present, 0)}
              onSelect={setSelected}
            />
          ) : null}
        </div>
      ))}
      <HourPanel
        hour={selected === null ? undefined : hours[selected]}
        reader={reader}
        onStep={(step) => setSelected(stepped(selected, step, hours.length))}
        onClose={() => setSelected(null)}
      />
      <figcaption className="px-5 pb-1">
        <NightLegend source={source} reader={reader} drawn={drawn} />
        <NightTable hours={hours} drawn={drawn} reader={reader} />
      </figcaption>
    </figure>
  )
}

/** Everything that opening an hour does not change. */
function prepare(source: StripSource, now: number) {
  const reader = readerOf(source)
  const hours = hoursOfNight(source, now)
  const drawn = stripHours(hours, reader.units)
  const figures = (['wide', 'narrow'] as const).map((size) => {
    const input = stripInput(source, drawn, now, size)
    return { size, layout: layOutNightStrip(input), words: stripWords(input, hours, reader) }
  })
  return { reader, hours, drawn, figures }
}

function stepped(selected: number | null, step: number, count: number): number {
  return Math.min(Math.max((selected ?? 0) + step, 0), count - 1)
}
