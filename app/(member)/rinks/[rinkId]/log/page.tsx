// The log: the season in a sentence, quick entry, the nights, the figures and the charts.
import { randomUUID } from 'node:crypto'
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { RinkFrame } from '@/components/rinks/rink-frame'
import { ButtonLink } from '@/components/ui/button'
import { seasonName } from '@/lib/advice/season'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { logQuerySchema, type LogQuery } from '@/lib/schemas/log-query'
import { getLog, type LogView } from '@/lib/services/log-book'
import { seasonHeadline } from '@/lib/words/log-season'
import { unbroken } from '@/lib/words/unbroken'
import { Charts } from './_components/charts'
import { Filters, isFiltered, logAddress } from './_components/filters'
import { Nights } from './_components/nights'
import { QuickEntry } from './_components/quick-entry'
import { totalFigures, Totals } from './_components/totals'

export const metadata: Metadata = { title: 'Log' }

export default async function LogPage({ params, searchParams }: PageProps<'/rinks/[rinkId]/log'>) {
  const query = logQuerySchema.parse(await searchParams)
  const view = await orNotFound(getLog(await pageContext(), (await params).rinkId, query))
  const { rink, reader, season, totals, mayWrite, usual } = view
  return (
    <RinkFrame name={rink.name} about={`Season ${seasonName(season)}`} people={rink.people}>
      <h1 className="max-w-[24ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">
        {unbroken(seasonHeadline(totals, new Date(view.readAt), reader))}
      </h1>
      {mayWrite ? (
        <QuickEntry rinkId={rink.id} entryKey={randomUUID()} usual={usual} reader={reader} open={query.write ?? null} />
      ) : null}
      <div className="mt-6 gap-x-14 lg:grid lg:grid-cols-[1.6fr_1fr]">
        <NightList view={view} query={query} />
        <section className="mt-8 lg:mt-0">
          <h2 className="mb-2 font-semibold">This season</h2>
          <Totals figures={totalFigures(totals, reader)} />
          <SeasonLinks rinkId={rink.id} />
        </section>
      </div>
      <Charts charts={view.charts} reader={reader} />
    </RinkFrame>
  )
}

function NightList({ view, query }: { view: LogView; query: LogQuery }) {
  const { rink, nights, writers, olderBefore, mayWrite } = view
  const nothing = isFiltered(query) || query.before ? 'Nothing in the log fits that.' : 'Nothing is in the log yet.'
  return (
    <section>
      <h2 className="sr-only">Night by night</h2>
      <Filters rinkId={rink.id} query={query} writers={writers} />
      {nights.length === 0 ? (
        <p className="border-t border-rule py-3 text-graphite">
          {nothing} {mayWrite && !isFiltered(query) ? 'Start with the button of what you did last.' : ''}
        </p>
      ) : (
        <Nights view={view} />
      )}
      <div className="mt-5 flex flex-wrap gap-3 print:hidden">
        {query.before ? (
          <ButtonLink href={logAddress(rink.id, { ...query, before: undefined })}>Newest nights</ButtonLink>
        ) : null}
        {olderBefore ? (
          <ButtonLink href={logAddress(rink.id, { ...query, before: olderBefore })}>Older nights</ButtonLink>
        ) : null}
      </div>
    </section>
  )
}

const LINK = 'flex min-h-touch items-center text-ink underline'

function SeasonLinks({ rinkId }: { rinkId: string }) {
  const file = (format: string) => `/api/rinks/${rinkId}/log/export?format=${format}`
  return (
    <ul className="mt-4 list-none p-0 print:hidden">
      <li>
        <Link className={LINK} href={`/rinks/${rinkId}/log/season` as Route}>
          Season summary, for printing
        </Link>
      </li>
      <li>
        <Link className={LINK} href={`/rinks/${rinkId}/log/kept` as Route}>
          Forecasts kept, night by night
        </Link>
      </li>
      <li className="flex flex-wrap gap-x-5">
        <a className={LINK} href={file('csv')} download>
          Take the log as CSV
        </a>
        <a className={LINK} href={file('json')} download>
          Take the log as JSON
        </a>
      </li>
    </ul>
  )
}
