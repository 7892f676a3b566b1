// The numbers of the strip as a table.
import type { TonightHour } from '@/lib/schemas/tonight-view'
import type { WordOptions } from '@/lib/words/options'
import { numberText } from '@/lib/words/quantities'
import { doneByDayText } from '@/lib/words/times'
import type { StripHour } from '../charts/night-strip-layout'
import { DataTable } from '../ui/data-table'
import { Disclosure } from '../ui/disclosure'
import { amountText } from './amount-text'
import { VERDICT_WORDS } from './verdict-words'

interface NightTableProps {
  hours: TonightHour[]
  /** Of each hour. */
  names: string[]
  /** The same hours as the strip draws them: rates and temperatures in the reader's units. */
  drawn: StripHour[]
  reader: WordOptions
}

export function NightTable({ hours, names, drawn, reader }: NightTableProps) {
  const columns = [
    { head: 'Hour' },
    { head: 'Verdict' },
    { head: reader.units.ice === 'in' ? 'Freezes, in/h' : 'Freezes, mm/h', isFigure: true },
    { head: 'If poured, set by', isFigure: true },
    { head: `Air, °${reader.units.temperature}`, isFigure: true },
    { head: 'Falls', isFigure: true },
  ]
  const rows = hours.map((hour, index) => ({
    key: hour.time,
    cells: [names[index] ?? '', ...cellsOf(hour, drawn[index], reader)],
  }))
  return (
    <Disclosure summary="Show as table" className="text-small">
      <DataTable caption="Freeze rate, set time and weather by hour" columns={columns} rows={rows} />
      <p className="max-w-line pb-3 text-graphite">
        Each hour is judged as if it alone were poured, so a pass of the plan may set at another time.
      </p>
    </Disclosure>
  )
}

function cellsOf(hour: TonightHour, drawn: StripHour | undefined, reader: WordOptions): string[] {
  const figure = (value: number | null | undefined, digits: number) =>
    value == null ? 'no forecast' : numberText(value, digits, reader)
  return [
    VERDICT_WORDS[hour.verdict],
    figure(drawn?.rate, reader.units.ice === 'in' ? 2 : 1),
    hour.setsAt ? doneByDayText(hour.setsAt, hour.time, reader) : hour.isKnown ? 'not set' : 'unknown',
    figure(drawn?.air, 0),
    hour.weather && drawn ? amountText(drawn, reader) || 'nothing' : 'no forecast',
  ]
}
