// While waiting for the fill: when the hose could run, and when the ice would be there.
import { Facts, type Fact } from '@/components/ui/facts'
import type { AdviceWindow, FillOutlook, Spread } from '@/lib/advice/types'
import type { WeekView } from '@/lib/schemas/week-view'
import type { WordOptions } from '@/lib/words/options'
import { waterText } from '@/lib/words/quantities'
import { clockText, doneByText } from '@/lib/words/times'
import { longDayText } from '@/lib/words/week'
import { hoseHoursText } from '@/lib/words/week-night'

export function FillAhead({ outlook, reader }: { outlook: NonNullable<WeekView['outlook']>; reader: WordOptions }) {
  const { fill, fillWindows } = outlook
  if (fillWindows.length === 0) return null
  return (
    <div className="mb-8 gap-x-14 lg:grid lg:grid-cols-2">
      {fill.startsAt ? <TheFill fill={fill} startsAt={fill.startsAt} reader={reader} /> : null}
      <section className="mt-7 first:mt-0 lg:mt-0">
        <h2 className="mb-2 font-semibold">Times to start</h2>
        <div className="border-t border-rule">
          <Facts rows={fillWindows.map((window) => windowFact(window, reader))} />
        </div>
        {fill.startsAt ? null : (
          <p className="mt-2 text-small text-graphite">Too few forecast runs see these yet. Wait until more do.</p>
        )}
      </section>
    </div>
  )
}

function TheFill({ fill, startsAt, reader }: { fill: FillOutlook; startsAt: string; reader: WordOptions }) {
  const skin = fill.skinAtSpread?.p50 ?? fill.skinAt
  const rows: Fact[] = [
    { name: 'Best start', figure: momentText(startsAt, reader) },
    { name: 'Hose', figure: `${hoseHoursText(fill.hoseHours)}, ${waterText(fill.litres, reader)}` },
    { name: 'Skinned over', figure: skin ? momentText(skin, reader) : 'not within the forecast' },
    { name: 'Carries skaters', figure: spreadText(fill.carriesSkaterAt, reader) },
    ...(fill.frozenThroughAt ? [{ name: 'Frozen through', figure: spreadText(fill.frozenThroughAt, reader) }] : []),
  ]
  return (
    <section>
      <h2 className="mb-2 font-semibold">The fill</h2>
      <div className="border-t border-rule">
        <Facts rows={rows} />
      </div>
      <p className="mt-2 text-small text-graphite">
        Half of the forecast runs get there by the date; the span is from one run in ten to nine in ten.
      </p>
    </section>
  )
}

const momentText = (at: string, reader: WordOptions) => `${longDayText(at, reader)}, ${doneByText(at, reader)}`

/** "about Tue 19 January (Mon 18 January to later)"; the span is left out when all runs agree on the day, the middle
    when fewer than half of them get there. */
function spreadText({ p10, p50, p90 }: Spread, reader: WordOptions): string {
  if (!p10) return 'not within the forecast'
  if (!p50) return `${longDayText(p10, reader)} or later`
  const [early, middle, late] = [p10, p50, p90].map((at) => (at ? longDayText(at, reader) : 'later'))
  return early === late ? `about ${middle}` : `about ${middle} (${early} to ${late})`
}

function windowFact(window: AdviceWindow, reader: WordOptions): Fact {
  const span = `${clockText(window.startsAt, reader)} to ${clockText(window.latestStartAt, reader)}`
  const runs = window.runs > 0 ? `${Math.round(window.agreement * window.runs)} of ${window.runs} runs` : ''
  return { name: `${longDayText(window.startsAt, reader)}, ${span}`, figure: runs }
}
