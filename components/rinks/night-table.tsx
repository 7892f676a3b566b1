// The numbers of the strip as a table.
import type { TonightHour } from '@/lib/schemas/tonight-view'
import { DataTable } from '../ui/data-table'
import { Disclosure } from '../ui/disclosure'
import { clockTime, rainText, rateText, snowText, temperatureText, type Reader } from './quantities'
import { VERDICT_WORDS } from './strip-words'

const COLUMNS = [
  { head: 'Hour' },
  { head: 'Verdict' },
  { head: 'Freezes', isFigure: true },
  { head: 'Poured then, set by', isFigure: true },
  { head: 'Air', isFigure: true },
  { head: 'Snow', isFigure: true },
  { head: 'Rain', isFigure: true },
]

export function NightTable({ hours, reader }: { hours: TonightHour[]; reader: Reader }) {
  return (
    <Disclosure summary="Show as table" className="text-small">
      <DataTable
        caption="Freeze rate, set time and weather by hour"
        columns={COLUMNS}
        rows={hours.map((hour) => ({ key: hour.time, cells: cellsOf(hour, reader) }))}
      />
    </Disclosure>
  )
}

function cellsOf(hour: TonightHour, reader: Reader): string[] {
  const { weather, freezeRateMmPerH: rate } = hour
  const orMissing = (value: number | null | undefined, text: (value: number, reader: Reader) => string) =>
    value === null || value === undefined ? 'no forecast' : text(value, reader)
  const amount = (value: number | null | undefined, text: (value: number, reader: Reader) => string) =>
    value === 0 ? 'none' : orMissing(value, text)
  return [
    clockTime(hour.time, reader),
    VERDICT_WORDS[hour.verdict],
    orMissing(hour.isKnown ? rate : null, rateText),
    hour.setsAt ? clockTime(hour.setsAt, reader) : hour.isKnown ? 'not set' : 'unknown',
    orMissing(weather?.airTemperatureC, temperatureText),
    amount(weather?.snowfallCm, snowText),
    amount(weather?.rainMm, rainText),
  ]
}
