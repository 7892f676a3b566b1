// Lists of the season: thaws, and what next year needs.
import { dayText } from '@/components/rinks/reader'
import type { EntryView } from '@/lib/schemas/log-choices'
import type { SeasonView } from '@/lib/services/log-season'
import type { WordOptions } from '@/lib/words/options'
import { orderByText } from '@/lib/words/sums'
import { clockText } from '@/lib/words/times'

export function EntryLines({ entries, reader, empty }: { entries: EntryView[]; reader: WordOptions; empty: string }) {
  if (entries.length === 0) return <p className="border-t border-rule py-3 text-note text-graphite">{empty}</p>
  return (
    <ul className="list-none border-t border-rule p-0">
      {entries.map((entry) => (
        <li key={entry.id} className="border-b border-rule py-2 text-note">
          <span className="font-medium">{dayText(entry.nightDate)}</span>, {clockText(entry.happenedAt, reader)}
          {entry.note ? <span className="block text-graphite">{entry.note}</span> : null}
        </li>
      ))}
    </ul>
  )
}

export function NextYear({ view }: { view: SeasonView }) {
  const tasks = view.repairs.filter(({ note }) => note !== '')
  return (
    <section className="break-inside-avoid">
      <h2 className="mt-8 mb-1 font-semibold">For next year</h2>
      <ul className="list-none border-t border-rule p-0">
        <li className="flex gap-3 border-b border-rule py-2 text-note">
          <Box />
          {orderByText(view.reader)}
        </li>
        {tasks.map(({ id, nightDate, note }) => (
          <li key={id} className="flex gap-3 border-b border-rule py-2 text-note">
            <Box />
            <span>
              Look at what was mended on {dayText(nightDate)}: {note}
            </span>
          </li>
        ))}
      </ul>
    </section>
  )
}

/** To tick with a pencil. */
function Box() {
  return (
    <svg viewBox="0 0 14 14" width={14} height={14} aria-hidden="true" className="mt-1 shrink-0">
      <rect x={1} y={1} width={12} height={12} fill="none" stroke="currentColor" />
    </svg>
  )
}
