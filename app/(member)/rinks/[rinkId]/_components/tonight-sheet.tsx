// The night sheet of one rink: verdict, how sure, the strip, the plan, cautions, why, water, source, and the days ahead.
'use client'
import { useClock } from '@/components/hooks/use-clock'
import { nightLabel, readerOf } from '@/components/rinks/reader'
import { NightStrip } from '@/components/rinks/night-strip'
import { RinkHeader } from '@/components/rinks/rink-header'
import { isGranted } from '@/lib/access/permissions'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { Cautions } from '@/components/rinks/cautions'
import { DataSource } from './data-source'
import { DaysAhead } from './days-ahead'
import { FirstForecast } from './first-forecast'
import { Mute } from './mute'
import { Plan } from './plan'
import { StatusNotices, ZoneNote } from './status-notices'
import { useTonight, type ChangeView } from './use-tonight'
import { Verdict } from './verdict'
import { WaterAndHose } from './water-and-hose'
import { Why } from './why'

type Judged = TonightView & { outlook: NonNullable<TonightView['outlook']> }

const isJudged = (view: TonightView): view is Judged => view.outlook !== null

export function TonightSheet({ initial }: { initial: TonightView }) {
  const { view, trouble, change, readAgain } = useTonight(initial)
  const now = useClock(view.readAt)
  return (
    <div className="mx-auto max-w-page px-5 pb-24 lg:px-9 lg:pb-12 print:p-0">
      <RinkHeader name={view.rink.name} about={nightLabel(view.night.date)} people={view.rink.people} />
      <main>
        <StatusNotices view={view} now={now} trouble={trouble} onReadAgain={readAgain} />
        {isJudged(view) ? (
          <JudgedNight view={view} now={now} change={change} />
        ) : (
          <FirstForecast hasFailed={view.lastReadFailed} />
        )}
      </main>
    </div>
  )
}

function JudgedNight({ view, now, change }: { view: Judged; now: number; change: ChangeView }) {
  const { passes, days, summary } = view.outlook
  const reader = readerOf(view)
  return (
    <>
      <Verdict view={view} summary={summary} now={now} />
      <NightStrip source={view} now={now} />
      <ZoneNote view={view} />
      <div className="lg:grid lg:grid-cols-[1.25fr_1fr] lg:gap-x-14 print:block">
        <section>
          <h2 className="mt-8 mb-2 text-body font-semibold">The plan</h2>
          {passes.length > 0 ? (
            <Plan view={view} passes={passes} change={change} />
          ) : (
            <p className="border-t border-rule pt-3">
              {summary.verdict === 'fill'
                ? 'No flood passes while the rink is being filled.'
                : 'No pass is planned for this night.'}
            </p>
          )}
          {isGranted(view.viewer.role, 'receiveAlerts') ? <Mute view={view} change={change} /> : null}
          <Cautions cautions={summary.cautions} reader={reader} />
        </section>
        <div>
          <Why summary={summary} reader={reader} />
          <WaterAndHose view={view} />
          <DataSource view={view} now={now} />
        </div>
      </div>
      <DaysAhead view={view} days={days} />
    </>
  )
}
