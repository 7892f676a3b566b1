// The ten days to come: a chart that is fetched once it is nearly in view, and the same numbers as a table.
'use client'
import { ChartFrame } from '@/components/charts/chart-frame'
import { readerOf, shortDayText } from '@/components/rinks/reader'
import type { WordOptions } from '@/lib/words/options'
import { layerText, rainText, snowText, temperatureRangeText } from '@/lib/words/quantities'
import { DataTable } from '@/components/ui/data-table'
import { Disclosure } from '@/components/ui/disclosure'
import type { DayAhead, TonightView } from '@/lib/schemas/tonight-view'
import { celsiusToFahrenheit, mmToInches } from '@/lib/units'

const loadChart = () => import('@/components/charts/days-ahead-chart')

const COLUMNS = [
  { head: 'Day' },
  { head: 'Air', isFigure: true },
  { head: 'Could freeze', isFigure: true },
  { head: 'Hours to flood', isFigure: true },
  { head: 'Snow', isFigure: true },
  { head: 'Rain', isFigure: true },
]

export function DaysAhead({ view, days }: { view: TonightView; days: DayAhead[] }) {
  const reader = readerOf(view)
  const depthUnit = reader.units.ice === 'in' ? 'in' : 'mm'
  const airUnit = `°${reader.units.temperature}`
  return (
    <section className="mt-10">
      <h2 className="mb-2 text-body font-semibold">The days ahead</h2>
      <ChartFrame
        load={loadChart}
        chart={{ days: days.map((day) => columnOf(day, reader)), depthUnit, airUnit }}
        className="h-[240px]"
      />
      <p className="mt-1 text-small text-graphite">
        Bars: {depthUnit === 'in' ? 'inches' : depthUnit} of water that could freeze in the day, solid where there are
        hours to flood. Lines: high of the air, and low dashed, {airUnit}.
      </p>
      <Disclosure summary="Show as table" className="text-small">
        <DataTable
          caption="The days ahead"
          columns={COLUMNS}
          rows={days.map((day) => ({ key: day.date, cells: cellsOf(day, reader) }))}
        />
      </Disclosure>
    </section>
  )
}

function columnOf(day: DayAhead, { units }: WordOptions) {
  const round = (value: number | null, digits: number) => (value === null ? null : Number(value.toFixed(digits)))
  const air = (value: number | null) =>
    round(value === null || units.temperature === 'C' ? value : celsiusToFahrenheit(value), 0)
  return {
    day: shortDayText(day.date),
    freezable:
      units.ice === 'in'
        ? round(day.freezableMm === null ? null : mmToInches(day.freezableMm), 2)
        : round(day.freezableMm, 0),
    low: air(day.lowC),
    high: air(day.highC),
    hasFloodHours: day.floodHours > 0,
  }
}

function cellsOf(day: DayAhead, reader: WordOptions): string[] {
  const text = (value: number | null, write: (value: number, reader: WordOptions) => string) =>
    value === null ? 'unknown' : write(value, reader)
  return [
    shortDayText(day.date),
    day.lowC === null || day.highC === null ? 'unknown' : temperatureRangeText(day.lowC, day.highC, reader),
    text(day.freezableMm, layerText),
    String(day.floodHours),
    text(day.snowCm, snowText),
    text(day.rainMm, rainText),
  ]
}
