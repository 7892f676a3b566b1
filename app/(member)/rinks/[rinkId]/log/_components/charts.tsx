// The season's charts: fetched once they are nearly in view, each with its sentence and the same numbers as a table.
'use client'
import type { ReactNode } from 'react'
import { ChartFrame } from '@/components/charts/chart-frame'
import { dayText, shortDayText } from '@/components/rinks/reader'
import { DataTable, type Column } from '@/components/ui/data-table'
import { Disclosure } from '@/components/ui/disclosure'
import { scaleOf } from '@/lib/schemas/measures'
import type { LogCharts } from '@/lib/services/log-charts'
import { muchWaterText } from '@/lib/words/log'
import { thicknessSummary, waterSummary, weeksSummary } from '@/lib/words/log-season'
import type { WordOptions } from '@/lib/words/options'
import { iceText } from '@/lib/words/quantities'

const loadThickness = () => import('./thickness-chart')
const loadBars = () => import('./bars-chart')
const HEIGHT = 'h-[220px]'

export function Charts({ charts, reader }: { charts: LogCharts; reader: WordOptions }) {
  return (
    <div className="mt-12 gap-x-14 lg:grid lg:grid-cols-3 print:hidden">
      <Thickness days={charts.thickness} reader={reader} />
      <Water nights={charts.water} reader={reader} />
      <Weeks weeks={charts.weeks} />
    </div>
  )
}

interface ChartProps {
  title: string
  summary: string
  isEmpty: boolean
  table: { columns: Column[]; rows: { key: string; cells: string[] }[] }
  children: ReactNode
}

function Chart({ title, summary, isEmpty, table, children }: ChartProps) {
  return (
    <section className="mb-10">
      <h2 className="mb-1 font-semibold">{title}</h2>
      <p className="mb-2 text-note text-graphite">{summary}</p>
      {isEmpty ? null : (
        <>
          {children}
          <Disclosure summary="Show as table" className="text-small">
            <DataTable caption={`${title}, in figures`} {...table} />
          </Disclosure>
        </>
      )}
    </section>
  )
}

function Thickness({ days, reader }: { days: LogCharts['thickness']; reader: WordOptions }) {
  const { fromSi, unit } = scaleOf('iceThickness', reader.units)
  const shown = (mm: number | null) => (mm === null ? null : Number(fromSi(mm).toFixed(1)))
  const text = (mm: number | null) => (mm === null ? '' : iceText(mm, reader))
  const known = days.filter(({ modelMm, readingMm }) => modelMm !== null || readingMm !== null)
  return (
    <Chart
      title="Thickness"
      summary={thicknessSummary(days, reader)}
      isEmpty={days.length === 0}
      table={{
        columns: [{ head: 'Day' }, { head: 'Model', isFigure: true }, { head: 'Measured', isFigure: true }],
        rows: known.map(({ date, modelMm, readingMm }) => ({
          key: date,
          cells: [dayText(date), text(modelMm), text(readingMm)],
        })),
      }}
    >
      <ChartFrame
        load={loadThickness}
        className={HEIGHT}
        chart={{
          unit,
          days: days.map(({ date, modelMm, readingMm }) => ({
            day: shortDayText(date),
            model: shown(modelMm),
            measured: shown(readingMm),
          })),
        }}
      />
    </Chart>
  )
}

function Water({ nights, reader }: { nights: LogCharts['water']; reader: WordOptions }) {
  const { fromSi } = scaleOf('bucket', reader.units)
  return (
    <Chart
      title="Water by night"
      summary={waterSummary(nights, reader)}
      isEmpty={nights.length === 0}
      table={{
        columns: [{ head: 'Night' }, { head: 'Floods', isFigure: true }, { head: 'Water', isFigure: true }],
        rows: nights.map(({ nightDate, floods, waterL }) => ({
          key: nightDate,
          cells: [dayText(nightDate), String(floods), muchWaterText(waterL, reader)],
        })),
      }}
    >
      <ChartFrame
        load={loadBars}
        className={HEIGHT}
        chart={{
          name: 'water',
          unit: reader.units.water,
          look: 'water',
          bars: nights.map(({ nightDate, waterL }) => ({
            day: shortDayText(nightDate),
            value: Math.round(fromSi(waterL)),
          })),
        }}
      />
    </Chart>
  )
}

function Weeks({ weeks }: { weeks: LogCharts['weeks'] }) {
  return (
    <Chart
      title="Nights flooded by week"
      summary={weeksSummary(weeks)}
      isEmpty={weeks.length === 0}
      table={{
        columns: [{ head: 'Week from' }, { head: 'Nights flooded', isFigure: true }],
        rows: weeks.map(({ from, nights }) => ({ key: from, cells: [dayText(from), String(nights)] })),
      }}
    >
      <ChartFrame
        load={loadBars}
        className={HEIGHT}
        chart={{
          name: 'nights flooded',
          unit: '',
          look: 'nights',
          bars: weeks.map(({ from, nights }) => ({ day: shortDayText(from), value: nights })),
        }}
      />
    </Chart>
  )
}
