// One entry: what it says, changing it, what it said before, and taking it out or back in.
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { RinkFrame } from '@/components/rinks/rink-frame'
import { Notice } from '@/components/ui/notice'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { entrySchema } from '@/lib/schemas/log'
import { getEntry, type EntryPage as EntryPageView } from '@/lib/services/log-book'
import { entryFacts, entryRemark, entryTime, KIND_WORDS, nightHeading } from '@/lib/words/log'
import { oldValues } from '../_components/entry-values'
import { AnswerForm } from '../_components/set-question'
import { ChangeForm } from './_components/change-form'
import { History } from './_components/history'
import { RemoveForm } from './_components/remove-form'

export const metadata: Metadata = { title: 'Log entry' }

const HALF_DAY_MILLIS = 12 * HOUR_MILLIS

export default async function EntryPage({ params }: PageProps<'/rinks/[rinkId]/log/[entryId]'>) {
  const view = await orNotFound(readEntry(await params))
  const { rink, entry, reader, mayWrite } = view
  const facts = entryFacts(entry, reader)
  const night = nightHeading(entry.nightDate, new Date(view.readAt), reader)
  return (
    <RinkFrame name={rink.name} about={night} people={rink.people}>
      <p className="print:hidden">
        <Link
          href={`/rinks/${rink.id}/log` as Route}
          className="inline-flex min-h-touch items-center text-ink underline"
        >
          All of the log
        </Link>
      </p>
      <h1 className="mt-2 mb-2 max-w-[26ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">
        {KIND_WORDS[entry.kind]}, {entryTime(entry.happenedAt, entry.nightDate, reader)}
      </h1>
      <p className="max-w-line">{[facts, entry.by ? `by ${entry.by}` : ''].filter(Boolean).join('; ')}</p>
      <p className="max-w-line text-graphite">{entryRemark(entry, reader)}</p>
      {entry.note ? <p className="mt-3 max-w-line whitespace-pre-line">{entry.note}</p> : null}
      {entry.isDeleted ? (
        <Notice tone="caution">This entry is deleted. The sums and the model leave it out.</Notice>
      ) : null}
      <div className="gap-x-14 lg:grid lg:grid-cols-[1.2fr_1fr]">
        {mayWrite ? <Work view={view} /> : null}
        <History view={view} />
      </div>
    </RinkFrame>
  )
}

async function readEntry(params: { rinkId: string; entryId: string }): Promise<EntryPageView> {
  const { rinkId, entryId } = entrySchema.parse(params)
  return getEntry(await pageContext(), rinkId, entryId)
}

function Work({ view }: { view: EntryPageView }) {
  const { rink, entry, reader } = view
  const ids = { rinkId: rink.id, entryId: entry.id }
  if (entry.isDeleted) return <RemoveForm {...ids} isDeleted />
  const age = Date.parse(view.readAt) - Date.parse(entry.happenedAt)
  return (
    <div>
      {entry.kind === 'flood' ? (
        <section>
          <h2 className="mt-8 mb-1 font-semibold">How did it set?</h2>
          <AnswerForm
            key={entry.version}
            {...ids}
            version={entry.version}
            isRecent={age < HALF_DAY_MILLIS}
            about=""
            canTakeBack={entry.outcome !== null}
          />
        </section>
      ) : null}
      <section>
        <h2 className="mt-8 mb-3 font-semibold">Change it</h2>
        <ChangeForm
          {...ids}
          kind={entry.kind}
          version={entry.version}
          units={reader.units}
          initial={oldValues(entry, view)}
        />
      </section>
      <RemoveForm {...ids} isDeleted={false} />
    </div>
  )
}
