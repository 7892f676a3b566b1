// The night strip of one rink: drawing, hours to open, legend, and the same numbers as a table.
'use client'
import { memo, useCallback, useMemo, useState, type ComponentProps } from 'react'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { useMedia } from '../hooks/use-media'
import { bracketsOf, layOutNightStrip } from '../charts/night-strip-layout'
import { NightStripDrawing } from '../charts/night-strip-drawing'
import { StripHours } from '../charts/strip-hours'
import { hourNames } from './hour-names'
import { HourPanel } from './hour-panel'
import { NightLegend } from './night-legend'
import { NightTable } from './night-table'
import { readerOf } from './reader'
import { hoursOfNight, stripHours, stripInput, stripPasses, type StripSize, type StripSource } from './strip-input'
import { stripWords } from './strip-words'

const Legend = memo(NightLegend)
const Table = memo(NightTable)

/** Hours that nobody sees need not answer a touch. */
const ShownHours = memo(function ShownHours({
  size,
  ...hours
}: { size: StripSize } & ComponentProps<typeof StripHours>) {
  const isWide = useMedia(WIDE)
  return isWide === (size === 'wide') ? <StripHours {...hours} /> : null
})

/** The same width as in SHOWN. */
const WIDE = '(min-width: 720px)'

const SHOWN: Record<StripSize, string> = {
  wide: 'relative hidden min-[720px]:block print:block',
  narrow: 'relative min-[720px]:hidden print:hidden',
}

/** The drawing and its hours; the table and the legend are drawn anew only when the hours change. */
export function NightStrip({ source, now }: { source: StripSource; now: number }) {
  const [selected, setSelected] = useState<number | null>(null)
  const { night, rink, viewer } = source
  const { hours: scored } = source.outlook
  // Hours stay as they are while passes are moved: only the figures are laid out again then.
  const { reader, hours, names, drawn } = useMemo(
    () => readHours({ night, rink, viewer, outlook: { hours: scored, passes: [] } }, now),
    [night, rink, viewer, scored, now],
  )
  const figures = useMemo(
    () => layOut({ night, rink, viewer, outlook: { hours: scored, passes: [] } }, { reader, hours, drawn }, now),
    [night, rink, viewer, scored, reader, hours, drawn, now],
  )
  const nameOf = useCallback((index: number) => names[index] ?? '', [names])
  const present = drawn.findIndex((hour) => hour.startsAt + HOUR_MILLIS > now)
  return (
    <figure className="-mx-5 border-y border-rule bg-sheet pt-3 lg:mx-0 lg:border-x print:mx-0 print:border-x">
      {figures.map(({ size, input, layout, words }) => (
        <div key={size} className={SHOWN[size]}>
          <NightStripDrawing
            id={`strip-${size}`}
            layout={layout}
            words={words}
            brackets={bracketsOf({ ...input, passes: stripPasses(source) })}
          />
          <ShownHours
            size={size}
            layout={layout}
            label="Hours of the night"
            nameOf={nameOf}
            selected={selected}
            start={Math.max(present, 0)}
            onSelect={setSelected}
          />
        </div>
      ))}
      <HourPanel
        hour={selected === null ? undefined : hours[selected]}
        name={selected === null ? '' : (names[selected] ?? '')}
        reader={reader}
        onStep={(step) => setSelected(stepped(selected, step, hours.length))}
        onClose={() => setSelected(null)}
      />
      <figcaption className="px-5 pb-1">
        <Legend night={night} reader={reader} drawn={drawn} />
        <Table hours={hours} names={names} drawn={drawn} reader={reader} />
      </figcaption>
    </figure>
  )
}

type ReadHours = ReturnType<typeof readHours>

function readHours(source: StripSource, now: number) {
  const reader = readerOf(source)
  const hours = hoursOfNight(source, now)
  return { reader, hours, names: hourNames(hours, reader), drawn: stripHours(hours, reader.units) }
}

function layOut(source: StripSource, { reader, hours, drawn }: Omit<ReadHours, 'names'>, now: number) {
  return (['wide', 'narrow'] as const).map((size) => {
    const input = stripInput(source, drawn, now, size)
    return { size, input, layout: layOutNightStrip(input), words: stripWords(input, hours, reader) }
  })
}

function stepped(selected: number | null, step: number, count: number): number {
  return Math.min(Math.max((selected ?? 0) + step, 0), count - 1)
}
