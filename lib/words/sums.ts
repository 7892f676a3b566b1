// The building plan in sentences: the lead, and each sum with its figure.
import type { BuildSums, How, SumId } from '@/lib/advice/build-types'
import { BUILD } from '@/lib/advice/thresholds'
import { depthText, lengthText, momentText, pushText, roundedHours, shareText, volumeText } from './build-quantities'
import { num } from './clause'
import type { WordOptions } from './options'
import { areaText, countText, durationText, flowText, numberText } from './quantities'
import { howWords, type HowWords } from './sum-formulas'

export interface SumItem {
  id: SumId
  label: string
  figure: string
  detail: string
  how: HowWords
}

/** "17.6 m³ of water, about 12 hours of hose, in two goes." */
export function sumsLead(sums: BuildSums, words: WordOptions): string {
  const { hours } = sums.hose
  const hose = hours < 1.5 ? durationText(roundedHours(hours)) : `${numberText(hours, 0, words)} hours`
  const goes = sums.sessions.count === 1 ? 'in one go' : `in ${countText(sums.sessions.count)} goes`
  return `${volumeText(sums.water.volumeM3, words)} of water, about ${hose} of hose, ${goes}.`
}

/**
 * Every sum as a line: label, figure, what it means, and how it was made.
 *
 * @param today Date at the rink, 'yyyy-MM-dd': it tells whether the day to order by is past.
 */
export function sumItems(sums: BuildSums, today: string, words: WordOptions): SumItem[] {
  const lines = [...waterLines(sums, words), ...boardLines(sums, words), ...linerLines(sums, today, words)]
  return lines.map(({ how, ...line }) => ({ id: how.formulaId, ...line, how: howWords(how, words) }))
}

type Line = Omit<SumItem, 'id' | 'how'> & { how: How }

function waterLines(sums: BuildSums, words: WordOptions): Line[] {
  const { ground, water, flow, hose, sessions, wetted, cost } = sums
  return [
    {
      label: 'Ground',
      figure: areaText(ground.areaM2, words),
      detail: `${depthText(ground.fallM, words)} from the highest point to the lowest.`,
      how: ground.how,
    },
    {
      label: 'Water',
      figure: volumeText(water.volumeM3, words),
      detail: `Mean depth ${depthText(water.meanDepthM, words)}, deepest ${depthText(water.deepestM, words)}.`,
      how: water.how,
    },
    {
      label: 'Flow',
      figure: flowText(flow.lPerMin, words),
      detail: 'Measure it again on the day, with the hose at its full length.',
      how: flow.how,
    },
    {
      label: 'Hose',
      figure: durationText(roundedHours(hose.hours)),
      detail: `At ${flowText(flow.lPerMin, words)}; ${wettedDetail(sums, words)}`,
      how: hose.how,
    },
    {
      label: 'Times out',
      figure: countText(sessions.count),
      detail: `About ${durationText(roundedHours(sessions.hoursEach))} of hose each.`,
      how: sessions.how,
    },
    {
      label: 'Wetted',
      figure: areaText(wetted.byHour[0]?.wettedM2 ?? 0, words),
      detail: 'After the first hour of hose.',
      how: wetted.how,
    },
    ...(cost ? [costLine(cost, words)] : []),
  ]
}

function costLine({ amount, how }: NonNullable<BuildSums['cost']>, words: WordOptions): Line {
  return {
    label: 'Water bill',
    figure: numberText(amount, 2, words),
    detail: 'At the price you gave, without sewer charges.',
    how,
  }
}

function boardLines(sums: BuildSums, words: WordOptions): Line[] {
  const { boards, push, expansion } = sums
  return [
    {
      label: 'Boards at the low corner',
      figure: `${depthText(boards.heightM, words)} or more`,
      detail: boardsDetail(sums, words),
      how: boards.how,
    },
    {
      label: 'Push on the boards',
      figure: pushText(push.pushNPerM, words),
      detail: `${momentText(push.footMomentNmPerM, words)} at the foot, at the low corner.`,
      how: push.how,
    },
    {
      label: 'Rise on freezing',
      figure: depthText(expansion.riseM, words),
      detail: 'Ice takes a tenth more room than water, and between boards it goes up and out.',
      how: expansion.how,
    },
  ]
}

function linerLines({ liner, orderBy, meltWater }: BuildSums, today: string, words: WordOptions): Line[] {
  return [
    {
      label: 'Liner',
      figure: `${lengthText(liner.lengthM, words)} × ${lengthText(liner.widthM, words)}`,
      detail: 'Up, over and down the outside, with folds and some to spare.',
      how: liner.how,
    },
    {
      label: 'Order the liner by',
      figure: dateText(orderBy.date, words),
      detail: orderDetail(orderBy.date, today),
      how: orderBy.how,
    },
    {
      label: 'Melt water in spring',
      figure: volumeText(meltWater.volumeM3, words),
      detail: 'Decide now where it runs: not toward a neighbour.',
      how: meltWater.how,
    },
  ]
}

function orderDetail(date: string, today: string): string {
  if (today <= date) return 'By late November stock is thin.'
  return 'That day is past. Order now, ask first what lies in stock, and pay for express delivery: no fill before it is here.'
}

/** For the list of next year: the same day as in the plan, without its year. */
export function orderByText(words: WordOptions): string {
  const format = { day: 'numeric', month: 'long', timeZone: 'UTC' } as const
  const day = new Intl.DateTimeFormat(words.locale, format).format(
    Date.parse(`2001-${BUILD.orderByMonthDay}T12:00:00Z`),
  )
  return `Order liner, boards and brackets by ${day}: boards go up in late October, and shipping takes weeks.`
}

/** "the first three hours wet about half the floor" by what is nearest to three hours. */
function wettedDetail({ wetted }: BuildSums, words: WordOptions): string {
  const third = wetted.byHour[2]
  if (!third || third.hours !== 3) return 'it is in within three hours.'
  return `the first three hours wet ${shareText(third.wettedShare, words)} of the floor.`
}

function boardsDetail({ boards }: BuildSums, words: WordOptions): string {
  const values = boards.how.values
  const above = `${depthText(num(values, 'freeboardM'), words)} above the water`
  if (!boards.lumber) return `${above}. No pair of usual boards is that high: level the ground first.`
  return `${above}; ${boards.lumber.boards.join(' with ')} on edge reaches.`
}

function dateText(date: string, words: WordOptions): string {
  const format = { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' } as const
  return new Intl.DateTimeFormat(words.locale, format).format(Date.parse(`${date}T12:00:00Z`))
}
