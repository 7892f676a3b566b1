// What is told of the day to fill. Days are named by date: such news is read later than it was written.
import { isFillNear, type FillDayKind, type FillStart } from '@/lib/advice/fill-day-due'
import type { AdviceWindow, Base, FillOutlook } from '@/lib/advice/types'
import { agreementText } from './night'
import type { WordOptions } from './options'
import { countText, durationText, waterText } from './quantities'
import { clockText, datedPartText } from './times'
import { longDayText } from './week'

export interface FillDayNews {
  kind: FillDayKind
  /** The day to fill; of a day that was called off, the one that was told. */
  day: FillStart
  /** What the person was told last. */
  before: { kind: FillDayKind; startsAt: Date } | null
  fill: FillOutlook
  windows: readonly AdviceWindow[]
  base: Base
}

interface FillDayText {
  sentence: string
  before: string
  sure: string
  plan: string
  caveat: string
  ready: string[]
}

/** Hose time is told in half hours, as people plan. Ours. [min] */
const HOSE_STEP_MINUTES = 30

const GROUND: Record<Base, string> = {
  liner: 'The liner at hand, to be laid with slack, up and over the boards, and weighted against wind.',
  ground: 'The ground cleared of stones, sticks and leaves, so that water can spread.',
  snow: 'The snow packed firm and level, with no soft place that swallows water.',
}

export function fillDayText(news: FillDayNews, now: Date, words: WordOptions): FillDayText {
  const day = datedPartText(news.day.startsAt.toISOString(), words)
  if (news.kind === 'fill-closed') {
    return {
      sentence: `Hold off filling: ${day}, no longer holds.`,
      before: `Leave the ${news.base === 'liner' ? 'liner rolled up and the hose in' : 'hose in'}. You hear from us again when a day to fill stands firm.`,
      sure: '',
      plan: '',
      caveat: '',
      ready: [],
    }
  }
  return {
    sentence: `Fill ${day}.`,
    before: beforeText(news, words),
    sure: agreementText(windowAt(news) ?? { agreement: null, runs: 0 }),
    plan: planText(news, words),
    caveat: isFillNear(news.day.startsAt, now)
      ? ''
      : 'This is a plan and no decision yet: such a day can still move. You hear from us when it does.',
    ready: [
      GROUND[news.base],
      'Boards or banks standing and level, and the low corner known.',
      'Hose run through and drained, its washers tight, a backflow preventer on the tap.',
      'A look at local water restrictions: they come first.',
    ],
  }
}

function beforeText({ kind, before }: FillDayNews, words: WordOptions): string {
  if (kind === 'fill-ahead' || !before) return ''
  return before.kind === 'fill-closed'
    ? 'We had told you to hold off. This takes the place of it.'
    : `We had told you ${datedPartText(before.startsAt.toISOString(), words)}. This takes the place of it.`
}

/** "Start about 5 pm: 12,000 L, 8 h of hose in two turns. Skaters from about Sun 24 January." */
function planText({ day, fill }: FillDayNews, words: WordOptions): string {
  const minutes = Math.max(1, Math.round((fill.hoseHours * 60) / HOSE_STEP_MINUTES)) * HOSE_STEP_MINUTES
  const turns = fill.sessions?.length ?? 0
  const inTurns = turns > 1 ? ` in ${countText(turns)} turns` : ''
  const water = `about ${waterText(fill.litres, words)} and ${durationText(minutes)} of hose${inTurns}`
  const { p50 } = fill.carriesSkaterAt
  const carries = p50
    ? `Skaters from about ${longDayText(p50, words)}.`
    : 'The forecast ends before the ice carries skaters.'
  return `Best start ${clockText(day.startsAt, words)}: ${water}. ${carries}`
}

function windowAt({ windows, day }: FillDayNews): AdviceWindow | undefined {
  const at = day.startsAt.getTime()
  return windows.find(
    ({ kind, startsAt, endsAt }) => kind === 'fill' && Date.parse(startsAt) <= at && at < Date.parse(endsAt),
  )
}
