// The log, night by night: what was done, what was said of it, and what came.
import type { Route } from 'next'
import Link from 'next/link'
import { DAY_MILLIS } from '@/lib/physics/constants'
import type { EntryView } from '@/lib/schemas/log-choices'
import type { LogView } from '@/lib/services/log-book'
import { entryFacts, entryRemark, entryTime, floodResult, KIND_WORDS, nightHeading } from '@/lib/words/log'
import { SetQuestion } from './set-question'

export function Nights({ view }: { view: LogView }) {
  const { nights, reader, readAt } = view
  return nights.map(({ date, entries }) => (
    <section key={date}>
      <h3 className="pt-[18px] pb-1 text-small tracking-wide text-graphite">
        {nightHeading(date, new Date(readAt), reader)}
      </h3>
      <ul className="list-none border-t border-rule p-0">
        {entries.map((entry) => (
          <EntryLine key={entry.id} entry={entry} view={view} />
        ))}
      </ul>
    </section>
  ))
}

function EntryLine({ entry, view }: { entry: EntryView; view: LogView }) {
  const { reader, rink, mayWrite, readAt } = view
  const facts = entryFacts(entry, reader)
  const ageMillis = Date.parse(readAt) - Date.parse(entry.happenedAt)
  // Still wet is no last word, as long as somebody may look again.
  const isOpen =
    entry.kind === 'flood' && (entry.outcome === null || (entry.outcome === 'wet' && ageMillis < DAY_MILLIS))
  const about = `${KIND_WORDS[entry.kind]} of ${entryTime(entry.happenedAt, entry.nightDate, reader)}`
  return (
    <li className="grid grid-cols-[76px_1fr] gap-x-2.5 border-b border-rule sm:grid-cols-[76px_1fr_auto]">
      <time dateTime={entry.happenedAt} className="py-3 text-note text-graphite">
        {entryTime(entry.happenedAt, entry.nightDate, reader)}
      </time>
      <Link
        href={`/rinks/${rink.id}/log/${entry.id}` as Route}
        className="min-h-touch py-3 text-ink no-underline hover:underline"
      >
        <b className="font-semibold">{KIND_WORDS[entry.kind]}</b>
        {facts ? `, ${facts}` : ''}
        <Small text={entryRemark(entry, reader)} />
        <Small text={entry.note} />
        <Small text={entry.by ? `By ${entry.by}` : ''} />
      </Link>
      <div className="col-start-2 pb-3 text-note empty:hidden sm:col-start-3 sm:pt-3">
        <Result entry={entry} />
        {isOpen && mayWrite ? (
          <SetQuestion
            rinkId={rink.id}
            entryId={entry.id}
            version={entry.version}
            isRecent={ageMillis < DAY_MILLIS / 2}
            about={about}
          />
        ) : null}
      </div>
    </li>
  )
}

function Small({ text }: { text: string }) {
  return text ? <small className="block text-note whitespace-pre-line text-graphite">{text}</small> : null
}

/** In a word and a colour, never in a colour alone. */
function Result({ entry }: { entry: EntryView }) {
  const result = floodResult(entry)
  if (result === null) return null
  return <p className={result === 'kept' ? 'text-hose sm:text-right' : 'text-rust sm:text-right'}>{result}</p>
}
