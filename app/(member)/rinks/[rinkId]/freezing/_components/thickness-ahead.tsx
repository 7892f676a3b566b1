// Thickness ahead over the forecast runs: a sentence, a chart fetched once it is nearly in view, and the same as a table.
'use client'
import { ChartFrame } from '@/components/charts/chart-frame'
import { DataTable } from '@/components/ui/data-table'
import { Disclosure } from '@/components/ui/disclosure'
import type { ThicknessAhead as Ahead } from '@/lib/advice/freezing'
import { mmToInches } from '@/lib/units'
import type { WordOptions } from '@/lib/words/options'
import { iceText } from '@/lib/words/quantities'
import { clockText, weekdayText } from '@/lib/words/times'

const loadChart = () => import('@/components/charts/thickness-ahead-chart')

/** The chart has each of the three hours, the table every twelfth. */
const TABLE_STEP = 4

const COLUMNS = [
  { head: 'When' },
  { head: 'Nine of ten runs reach', isFigure: true },
  { head: 'Middle', isFigure: true },
  { head: 'One of ten reaches', isFigure: true },
]

interface Props {
  ahead: readonly Ahead[]
  carriesSkaterMm: number
  reader: WordOptions
}

export function ThicknessAhead({ ahead, carriesSkaterMm, reader }: Props) {
  const isInches = reader.units.ice === 'in'
  const inUnit = (mm: number) => Number((isInches ? mmToInches(mm) : mm / 10).toFixed(2))
  const momentText = (at: string) => `${weekdayText(at, reader)} ${clockText(at, reader)}`
  const points = ahead.map(({ at, p10, p50, p90 }) => ({
    when: momentText(at),
    day: weekdayText(at, reader).slice(0, 3),
    middle: inUnit(p50),
    spread: [inUnit(p10), inUnit(p90)] as [number, number],
  }))
  return (
    <section className="mt-7">
      <h2 className="mb-2 font-semibold">Thickness ahead</h2>
      <figure className="-mx-5 border-y border-rule bg-sheet px-3 pt-3 pb-2 lg:mx-0 lg:border-x">
        <ChartFrame
          load={loadChart}
          chart={{ points, carries: inUnit(carriesSkaterMm), unit: isInches ? 'in' : 'cm' }}
          className="h-[220px]"
        />
        <figcaption className="px-2 text-small text-graphite">
          {summaryOf(ahead, reader)} Line: the middle run; band: eight runs of ten; dashed:{' '}
          {iceText(carriesSkaterMm, reader)}, which carries a skater.
        </figcaption>
      </figure>
      <Disclosure summary="Show as table" className="text-small">
        <DataTable
          caption="Thickness ahead"
          columns={COLUMNS}
          rows={ahead
            .filter((_, index) => index % TABLE_STEP === 0)
            .map(({ at, p10, p50, p90 }) => ({
              key: at,
              cells: [momentText(at), iceText(p10, reader), iceText(p50, reader), iceText(p90, reader)],
            }))}
        />
      </Disclosure>
    </section>
  )
}

/** "By Tuesday 6 pm between 8.1 and 10.4 cm." */
function summaryOf(ahead: readonly Ahead[], reader: WordOptions): string {
  const inThreeDays = ahead[Math.min(ahead.length - 1, 24)]
  if (!inThreeDays) return ''
  const { at, p10, p90 } = inThreeDays
  return `By ${weekdayText(at, reader)} ${clockText(at, reader)} between ${iceText(p10, reader)} and ${iceText(p90, reader)}.`
}
