// Forecasts kept: the open record of what was said of each night and what came of it.
import type { Metadata } from 'next'
import { shortDateText } from '@/lib/words/night-label'
import { RinkFrame } from '@/components/rinks/rink-frame'
import { seasonName } from '@/lib/advice/season'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { seasonYearSchema } from '@/lib/schemas/season'
import { getKeptNights, type KeptView } from '@/lib/services/kept-nights'
import { cameText, keptSentence, rateText, saidText } from '@/lib/words/kept'
import { yardDoubtSentence, yardSentence } from '@/lib/words/yard'

export const metadata: Metadata = { title: 'Forecasts kept' }

const RESULT_WORDS = { kept: 'Kept', broken: 'Broken', unknown: 'Not known' }

export default async function KeptPage({ params, searchParams }: PageProps<'/rinks/[rinkId]/log/kept'>) {
  const { rinkId } = await params
  const year = seasonYearSchema.parse((await searchParams).season)
  const view = await orNotFound(getKeptNights(await pageContext(), rinkId, year))
  const { rink, reader, rates, season, nights, learned } = view
  return (
    <RinkFrame name={rink.name} about={`Season ${seasonName(season)}`}>
      <h1 className="mb-4 max-w-[26ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">
        {keptSentence(rates)}
      </h1>
      <p className="mb-8 max-w-line text-graphite">
        Each night is settled after noon. What somebody found counts first; without a report the night is judged again
        with the weather that came. A flood is kept when every advised pass would have set by 7 am with no rain or snow
        on it; holding off is kept when no hour turned out good.
      </p>
      {nights.length === 0 ? null : <Record view={view} />}
      {learned ? (
        <section className="mt-8 max-w-line">
          <h2 className="mb-3 border-b border-rule pb-2 font-semibold">What your yard has taught</h2>
          <p>
            {yardSentence(learned, reader)} {yardDoubtSentence(learned, reader)}
          </p>
        </section>
      ) : null}
    </RinkFrame>
  )
}

function Record({ view: { rates, nights, reader } }: { view: KeptView }) {
  const bands = rates.bands.filter(({ rate }) => rate.of > 0)
  return (
    <div className="grid gap-x-14 gap-y-8 lg:grid-cols-[1fr_18rem]">
      <table className="w-full border-collapse text-note">
        <caption className="pb-1 text-left text-graphite">Night by night, newest first</caption>
        <thead>
          <tr className="border-b border-rule text-left">
            <th scope="col" className="py-2 pr-4 font-medium">
              Night
            </th>
            <th scope="col" className="py-2 pr-4 font-medium">
              What was said, and what came
            </th>
            <th scope="col" className="py-2 font-medium">
              Result
            </th>
          </tr>
        </thead>
        <tbody>
          {nights.map((night) => (
            <NightRow key={night.nightDate} night={night} reader={reader} />
          ))}
        </tbody>
      </table>
      <section>
        <h2 className="mb-3 border-b border-rule pb-2 font-semibold">Rates</h2>
        <dl className="grid grid-cols-[1fr_auto] gap-x-4 gap-y-2">
          <Line term="Floods kept" value={rateText(rates.flood)} />
          <Line term="Holding off kept" value={rateText(rates.hold)} />
          {bands.map(({ from, to, rate }) => (
            <Line
              key={from}
              term={`Floods that ${Math.round(from * 100)} to ${Math.round(to * 100)} % of runs agreed on`}
              value={rateText(rate)}
            />
          ))}
          {rates.unknown > 0 ? <Line term="Nights not known" value={String(rates.unknown)} /> : null}
        </dl>
      </section>
    </div>
  )
}

function NightRow({ night, reader }: { night: KeptView['nights'][number]; reader: KeptView['reader'] }) {
  const { startsAt, endsAt, agreement } = night
  const times = { startsAt: startsAt?.toISOString() ?? null, endsAt: endsAt?.toISOString() ?? null }
  return (
    <tr className="border-b border-rule align-baseline">
      <th scope="row" className="py-2 pr-4 text-left font-medium whitespace-nowrap">
        {shortDateText(night.nightDate)}
      </th>
      <td className="py-2 pr-4">
        {saidText({ said: night.said, ...times }, reader)}
        {agreement === null ? null : (
          <span className="text-graphite">, {Math.round(agreement * 100)} % of runs agreed</span>
        )}
        <span className="block text-small text-graphite">{cameText(night, reader)}</span>
      </td>
      <td className={`py-2 whitespace-nowrap ${night.result === 'broken' ? 'font-medium text-rust' : ''}`}>
        {RESULT_WORDS[night.result]}
      </td>
    </tr>
  )
}

function Line({ term, value }: { term: string; value: string }) {
  return (
    <>
      <dt className="text-graphite">{term}</dt>
      <dd className="text-right tabular-nums">{value}</dd>
    </>
  )
}
