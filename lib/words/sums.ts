// The building plan in sentences: the lead, and each sum with its figure.
import type { BuildSums, How, SumId } from '@/lib/advice/build-types'
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

/** Every sum as a line: label, figure, what it means, and how it was made. */
export function sumItems(sums: BuildSums, words: WordOptions): SumItem[] {
  const { ground, water, flow, hose, sessions, wetted, cost, boards, push, expansion, liner, orderBy, meltWater } = sums
  const item = (id: SumId, label: string, figure: string, detail: string, { how }: { how: How }): SumItem => ({
    id,
    label,
    figure,
    detail,
    how: howWords(how, words),
  })
  const items = [
    item(
      'ground',
      'Ground',
      areaText(ground.areaM2, words),
      `${depthText(ground.fallM, words)} from the highest point to the lowest.`,
      ground,
    ),
    item(
      'water',
      'Water',
      volumeText(water.volumeM3, words),
      `Mean depth ${depthText(water.meanDepthM, words)}, deepest ${depthText(water.deepestM, words)}.`,
      water,
    ),
    item(
      'flow',
      'Flow',
      flowText(flow.lPerMin, words),
      'Measure it again on the day, with the hose at its full length.',
      flow,
    ),
    item(
      'hose',
      'Hose',
      durationText(roundedHours(hose.hours)),
      `At ${flowText(flow.lPerMin, words)}; ${wettedDetail(sums, words)}`,
      hose,
    ),
    item(
      'sessions',
      'Times out',
      countText(sessions.count),
      `About ${durationText(roundedHours(sessions.hoursEach))} of hose each.`,
      sessions,
    ),
    item('wetted', 'Wetted', areaText(wetted.byHour[0]?.wettedM2 ?? 0, words), 'After the first hour of hose.', wetted),
    cost
      ? item(
          'cost',
          'Water bill',
          numberText(cost.amount, 2, words),
          'At the price you gave, without sewer charges.',
          cost,
        )
      : null,
    item(
      'boards',
      'Boards at the low corner',
      `${depthText(boards.heightM, words)} or more`,
      boardsDetail(sums, words),
      boards,
    ),
    item(
      'push',
      'Push on the boards',
      pushText(push.pushNPerM, words),
      `${momentText(push.footMomentNmPerM, words)} at the foot, at the low corner.`,
      push,
    ),
    item(
      'expansion',
      'Rise on freezing',
      depthText(expansion.riseM, words),
      'Ice takes a tenth more room than water, and between boards it goes up and out.',
      expansion,
    ),
    item(
      'liner',
      'Liner',
      `${lengthText(liner.lengthM, words)} × ${lengthText(liner.widthM, words)}`,
      'Up, over and down the outside, with folds and some to spare.',
      liner,
    ),
    item('orderBy', 'Order the liner by', dateText(orderBy.date, words), 'By late November stock is thin.', orderBy),
    item(
      'meltWater',
      'Melt water in spring',
      volumeText(meltWater.volumeM3, words),
      'Decide now where it runs: not toward a neighbour.',
      meltWater,
    ),
  ]
  return items.filter((one) => one !== null)
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
