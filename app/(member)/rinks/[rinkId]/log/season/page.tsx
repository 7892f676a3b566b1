// The season on one page, to read and to print: what was done, what it took, how the ice stood, what next year needs.
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { RinkFrame } from '@/components/rinks/rink-frame'
import { seasonName, seasonOfYear } from '@/lib/advice/season'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { seasonYearSchema } from '@/lib/schemas/season'
import { getSeason, type SeasonView } from '@/lib/services/log-season'
import { rateText } from '@/lib/words/kept'
import { pastSeasonHeadline, seasonHeadline, thicknessSummary } from '@/lib/words/log-season'
import { unbroken } from '@/lib/words/unbroken'
import { durationText, numberText } from '@/lib/words/quantities'
import { Totals, totalFigures, type Figure } from '../_components/totals'
import { EntryLines, NextYear } from './_components/lists'
import { ThicknessCurve } from './_components/thickness-curve'

export const metadata: Metadata = { title: 'Season summary' }

export default async function SeasonPage({ params, searchParams }: PageProps<'/rinks/[rinkId]/log/season'>) {
  const year = seasonYearSchema.parse((await searchParams).season)
  const view = await orNotFound(getSeason(await pageContext(), (await params).rinkId, year))
  const { rink, season, reader, totals, thickness } = view
  const isOver = season.year < view.presentYear
  return (
    <RinkFrame name={rink.name} about={`Season ${seasonName(season)}`} people={rink.people}>
      <h1 className="max-w-[26ch] text-verdict font-medium tracking-tight lg:text-verdict-wide print:text-lead">
        {isOver ? pastSeasonHeadline(totals) : unbroken(seasonHeadline(totals, new Date(view.readAt), reader))}
      </h1>
      <OtherSeasons rinkId={rink.id} year={season.year} present={view.presentYear} />
      <div className="mt-4 gap-x-14 lg:grid lg:grid-cols-2 print:grid print:grid-cols-2 print:gap-x-8">
        <section className="break-inside-avoid">
          <h2 className="mb-2 font-semibold">The season in figures</h2>
          <Totals figures={[...totalFigures(totals, reader), ...waterFigures(view)]} />
        </section>
        <div>
          <KeptRates rates={view.rates} rinkId={rink.id} year={season.year} />
          <section className="break-inside-avoid">
            <h2 className="mt-8 mb-1 font-semibold">Thaws</h2>
            <EntryLines entries={view.thaws} reader={reader} empty="None written down." />
          </section>
        </div>
      </div>
      <section className="break-inside-avoid">
        <h2 className="mt-8 mb-1 font-semibold">Thickness</h2>
        <p className="mb-2 text-note text-graphite">{thicknessSummary(thickness, reader)}</p>
        <ThicknessCurve days={thickness} reader={reader} />
      </section>
      <NextYear view={view} />
    </RinkFrame>
  )
}

function waterFigures({ hoseHours, waterCost, totals, reader }: SeasonView): Figure[] {
  const figures: Figure[] = [
    { name: 'Scrapes', figure: String(totals.scrapes) },
    { name: 'Snow cleared', figure: `${totals.clears} ${totals.clears === 1 ? 'time' : 'times'}` },
  ]
  if (hoseHours !== null) {
    figures.push({ name: 'At the hose', figure: durationText(hoseHours * 60), note: 'by the flow of each source' })
  }
  if (waterCost !== null) {
    figures.push({
      name: 'Cost of water',
      figure: numberText(waterCost, 2, reader),
      note: 'by the price in the settings',
    })
  }
  return figures
}

function KeptRates({ rates, rinkId, year }: { rates: SeasonView['rates']; rinkId: string; year: number }) {
  const isEmpty = rates.flood.of + rates.hold.of === 0
  return (
    <section className="break-inside-avoid">
      <h2 className="mt-8 mb-1 font-semibold lg:mt-0 print:mt-0">Forecasts kept</h2>
      {isEmpty ? (
        <p className="border-t border-rule py-3 text-note text-graphite">
          No night of this season has been settled yet.
        </p>
      ) : (
        <dl className="grid grid-cols-[1fr_auto] gap-y-2 border-t border-rule py-3">
          <dt>Floods kept</dt>
          <dd>{rateText(rates.flood)}</dd>
          <dt>Holding off kept</dt>
          <dd>{rateText(rates.hold)}</dd>
        </dl>
      )}
      <Link
        href={`/rinks/${rinkId}/log/kept?season=${year}` as Route}
        className="inline-flex min-h-touch items-center text-ink underline print:hidden"
      >
        Night by night
      </Link>
    </section>
  )
}

function OtherSeasons({ rinkId, year, present }: { rinkId: string; year: number; present: number }) {
  const link = (other: number) => (
    <Link
      className="inline-flex min-h-touch items-center text-ink underline"
      href={`/rinks/${rinkId}/log/season?season=${other}` as Route}
    >
      Season {seasonName(seasonOfYear(other))}
    </Link>
  )
  return (
    <p className="flex flex-wrap gap-x-5 print:hidden">
      <Link className="inline-flex min-h-touch items-center text-ink underline" href={`/rinks/${rinkId}/log` as Route}>
        All of the log
      </Link>
      {link(year - 1)}
      {year < present ? link(year + 1) : null}
    </p>
  )
}
