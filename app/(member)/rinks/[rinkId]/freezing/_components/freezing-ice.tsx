// Ice that freezes: the estimate in a sentence, its course ahead, holes drilled, snow, and what to keep in mind.
import { DataSource } from '@/components/rinks/data-source'
import { ForecastNotice } from '@/components/rinks/forecast-notice'
import { StandingCautions } from '@/components/rinks/standing-cautions'
import { Notice } from '@/components/ui/notice'
import type { FreezingOutlook } from '@/lib/advice/freezing'
import { MODEL_VERSION } from '@/lib/advice/judge'
import type { FreezingView } from '@/lib/schemas/freezing-view'
import { spreadText } from '@/lib/words/filling'
import { carriesName, freezingSentence, snowOnIceText } from '@/lib/words/freezing'
import { capitalised, iceText, snowText } from '@/lib/words/quantities'
import { unbroken } from '@/lib/words/unbroken'
import { Drilled } from './drilled'
import { KeepOffSign } from './keep-off-sign'
import { ThicknessAhead } from './thickness-ahead'

interface Props {
  view: FreezingView
  outlook: FreezingOutlook
  entryKey: string
}

export function FreezingIce({ view, outlook, entryKey }: Props) {
  const { reader, rink, forecast, lastReadFailed } = view
  const now = new Date(view.readAt)
  const weather = forecast?.isStale ? 'stale' : 'fresh'
  const [lead = '', ...rest] = freezingSentence(outlook, now, reader, weather).split(/(?<=\.) (?=\S)/)
  return (
    <>
      <div className="print:hidden">
        <ForecastNotice forecast={forecast} lastReadFailed={lastReadFailed} now={now.getTime()} />
        <h1 className="mb-2 max-w-[24ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">
          {unbroken(lead)}
        </h1>
        <p className="mb-1 max-w-[60ch] text-lead">{unbroken(rest.join(' '))}</p>
        <p className="mb-5 max-w-[60ch] text-graphite">
          An estimate over {runsText(outlook.runs)}: a drilled hole is worth more, and the keeper decides.
        </p>
        {outlook.snow.map((caution) => (
          <Notice key={caution.code} tone="caution">
            <p>{snowOnIceText(caution, reader)}</p>
          </Notice>
        ))}
        <ThicknessAhead ahead={outlook.ahead} carriesSkaterMm={rink.carriesSkaterMm} reader={reader} />
        <div className="gap-x-14 lg:grid lg:grid-cols-2">
          <WhenItCarries outlook={outlook} now={now} view={view} />
          <div>
            <Drilled view={view} entryKey={entryKey} />
          </div>
        </div>
        <StandingCautions codes={['thickness_is_estimate', 'land_only']} reader={reader} heading="Keep in mind" />
        <Source view={view} />
      </div>
      <KeepOffSign view={view} outlook={outlook} weather={weather} />
    </>
  )
}

/** Ice is reckoned whenever the page is read. */
function Source({ view: { forecast, reader, readAt } }: { view: FreezingView }) {
  const source = { forecast, rink: reader, viewer: reader, outlook: { judgedAt: readAt, modelVersion: MODEL_VERSION } }
  return <DataSource view={source} now={Date.parse(readAt)} />
}

/** The forecast is one of the runs; elsewhere only the others are counted. */
const runsText = (runs: number) => (runs > 1 ? `the forecast and ${runs - 1} other runs` : 'the forecast alone')

function WhenItCarries({
  outlook,
  now,
  view: { reader },
}: {
  outlook: FreezingOutlook
  now: Date
  view: FreezingView
}) {
  const when = (spread: FreezingOutlook['skinAt']) => capitalised(spreadText(spread, now, reader))
  const { snowCoverCm, liquidMm } = outlook.now
  const rows = [
    { name: 'Skinned over', text: when(outlook.skinAt) },
    { name: carriesName(outlook, reader), text: when(outlook.carriesSkaterAt) },
    { name: 'Frozen through', text: when(outlook.frozenThroughAt) },
    ...(snowCoverCm >= 0.1 ? [{ name: 'Snow on it', text: snowText(snowCoverCm, reader) }] : []),
    ...(liquidMm >= 0.5 ? [{ name: 'Water on it', text: iceText(liquidMm, reader) }] : []),
  ]
  return (
    <section className="mt-8">
      <h2 className="mb-2 font-semibold">By when</h2>
      <dl className="border-t border-rule">
        {rows.map(({ name, text }) => (
          <div key={name} className="border-b border-rule py-[9px]">
            <dt className="text-note text-graphite">{name}</dt>
            <dd className="font-medium">{text}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-2 text-small text-graphite">
        From the day by which one forecast run of ten gets there to the one by which nine of ten do.
      </p>
    </section>
  )
}
