// The night sheet of one rink: verdict, how sure, the strip, the plan, cautions, why, water, source, and the days ahead.
'use client'
import { memo, useMemo, useState } from 'react'
import { useClock } from '@/components/hooks/use-clock'
import { DataSource } from '@/components/rinks/data-source'
import { nightLabel, readerOf } from '@/components/rinks/reader'
import { NightStrip } from '@/components/rinks/night-strip'
import { RinkHeader } from '@/components/rinks/rink-header'
import { isGranted } from '@/lib/access/permissions'
import type { TonightPass, TonightView } from '@/lib/schemas/tonight-view'
import { Cautions } from '@/components/rinks/cautions'
import { isForPerson } from '@/lib/words/cautions'
import { DaysAhead } from './days-ahead'
import { FirstForecast } from './first-forecast'
import { HoldNote } from './hold-note'
import { withPoured } from './kept-plan'
import { Mute } from './mute'
import { OFF_SEASON, OffSeason } from './off-season'
import { PhaseNote } from './phase-note'
import { Plan } from './plan'
import { RefusedCheckOffs } from './refused-check-offs'
import { StatusNotices, ZoneNote } from './status-notices'
import { summaryOfPlan } from './summary-of-plan'
import { TroubleBar } from './trouble-bar'
import { useCheckOffs, type CheckOffs } from './use-check-offs'
import { useTonight, type ChangeView } from './use-tonight'
import { Verdict } from './verdict'
import { WaterAndHose } from './water-and-hose'
import { Why } from './why'

type Judged = TonightView & { outlook: NonNullable<TonightView['outlook']> }

const isJudged = (view: TonightView): view is Judged => view.outlook !== null

export function TonightSheet({ initial }: { initial: TonightView }) {
  const { view: read, trouble, change, readAgain, readAfterChange } = useTonight(initial)
  const checkOffs = useCheckOffs(read, readAfterChange)
  const view = checkOffs.shown
  const now = useClock(view.readAt)
  return (
    <div className="mx-auto max-w-page px-5 pb-24 lg:px-9 lg:pb-12 print:p-0">
      <RinkHeader name={view.rink.name} about={nightLabel(view.night.date)} people={view.rink.people} />
      <main>
        <StatusNotices view={view} now={now} />
        <RefusedCheckOffs view={view} checkOffs={checkOffs} />
        {OFF_SEASON[view.rink.phase] ? (
          <OffSeason rink={view.rink} role={view.viewer.role} />
        ) : isJudged(view) ? (
          <JudgedNight view={view} now={now} change={change} checkOffs={checkOffs} />
        ) : (
          <FirstForecast hasFailed={view.lastReadFailed} />
        )}
        {trouble ? <TroubleBar view={view} now={now} trouble={trouble} onReadAgain={readAgain} /> : null}
      </main>
    </div>
  )
}

interface JudgedNightProps {
  view: Judged
  now: number
  change: ChangeView
  checkOffs: CheckOffs
}

function JudgedNight({ view, now, change, checkOffs }: JudgedNightProps) {
  const [moved, setMoved] = useState<TonightPass[] | null>(null)
  const { days, ownPlan } = view.outlook
  const passes = useMemo(
    () => (moved ? withPoured(moved, view.outlook.passes) : view.outlook.passes),
    [moved, view.outlook.passes],
  )
  const isOwn = moved !== null || ownPlan !== null
  const summary = useMemo(
    () => (isOwn ? summaryOfPlan(view.outlook.summary, passes) : view.outlook.summary),
    [isOwn, view.outlook.summary, passes],
  )
  // A moved pass is drawn at once, before it is kept.
  const drawn = useMemo(() => ({ ...view, outlook: { ...view.outlook, passes } }), [view, passes])
  return (
    <>
      <SteadyVerdict view={view} summary={summary} now={now} />
      <SteadyPhase rink={view.rink} isFloodNight={summary.verdict === 'flood'} role={view.viewer.role} />
      <NightStrip source={drawn} now={now} />
      <SteadyZone view={view} />
      <div className="lg:grid lg:grid-cols-[1.25fr_1fr] lg:gap-x-14 print:block">
        <section>
          <h2 className="mb-2 text-body font-semibold">The plan</h2>
          {passes.length > 0 ? (
            <Plan view={view} passes={passes} now={now} change={change} checkOffs={checkOffs} onMove={setMoved} />
          ) : (
            <p className="border-t border-rule pt-3">
              {summary.verdict === 'fill'
                ? 'No flood passes while the rink is being filled.'
                : 'No pass is planned for this night.'}
            </p>
          )}
          {isGranted(view.viewer.role, 'receiveAlerts') ? <SteadyMute view={view} change={change} /> : null}
          <SteadyForYou view={view} />
        </section>
        <div>
          <SteadyReasons view={view} now={now} />
          <WaterAndHose water={view.rink.water} passes={passes} reader={readerOf(view)} />
          <SteadySource view={view} now={now} />
        </div>
      </div>
      <SteadyDays view={view} days={days} />
    </>
  )
}

// Each is drawn again only when what it shows changes: moving a pass changes the verdict's count and time alone.
const SteadyVerdict = memo(Verdict)
const SteadySource = memo(DataSource)
const SteadyPhase = memo(PhaseNote)
const SteadyZone = memo(ZoneNote)
const SteadyMute = memo(Mute)
const SteadyDays = memo(DaysAhead)

const SteadyForYou = memo(function ForYouAndTheIce({ view }: { view: Judged }) {
  const reader = readerOf(view)
  const { cautions } = view.outlook.summary
  return (
    <>
      <Cautions heading="For you" cautions={cautions.filter(isForPerson)} reader={reader} />
      <Cautions heading="For the ice" cautions={cautions.filter((one) => !isForPerson(one))} reader={reader} />
    </>
  )
})

const SteadyReasons = memo(function Reasons({ view, now }: { view: Judged; now: number }) {
  return (
    <>
      <HoldNote view={view} now={now} />
      <Why summary={view.outlook.summary} reader={readerOf(view)} />
    </>
  )
})
