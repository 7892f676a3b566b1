// What an entry said before each change, newest first.
import { dayText } from '@/components/rinks/reader'
import { localDateOf } from '@/lib/advice/zoned-time'
import type { EntryView } from '@/lib/schemas/log-choices'
import type { EntryPage } from '@/lib/services/log-book'
import { entrySentence } from '@/lib/words/log'
import { clockText } from '@/lib/words/times'

export function History({ view: { entry, history, reader } }: { view: EntryPage }) {
  return (
    <section>
      <h2 className="mt-8 mb-1 font-semibold">History</h2>
      {history.length === 0 ? (
        <p className="border-t border-rule py-3 text-note text-graphite">It stands as it was written.</p>
      ) : (
        <ol className="list-none border-t border-rule p-0">
          {history.map(({ was, changedBy, changedAt }, index) => (
            <li key={was.version} className="border-b border-rule py-3 text-note">
              <p>
                <b className="font-semibold">{changedBy ?? 'Somebody'}</b>{' '}
                {deedOf(was, history[index - 1]?.was ?? entry)} on{' '}
                {dayText(localDateOf(Date.parse(changedAt), reader.timeZone))} at {clockText(changedAt, reader)}.
              </p>
              <p className="text-graphite">Before: {entrySentence(was, reader)}</p>
            </li>
          ))}
        </ol>
      )}
    </section>
  )
}

function deedOf(before: EntryView, after: EntryView): string {
  if (before.isDeleted !== after.isDeleted) return after.isDeleted ? 'deleted it' : 'brought it back'
  if (before.outcome !== after.outcome || before.outcomeAt !== after.outcomeAt) return 'answered for it'
  return 'changed it'
}
