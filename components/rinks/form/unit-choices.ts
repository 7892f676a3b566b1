// Which sets of units the set-up form offers: a metric one as the country writes it, the US one, and the person's own mixture.
import { IMPERIAL, METRIC, unitsCode, type Units } from '@/lib/units'

/** Wind is told in several units where all else is metric. */
const isMetric = ({ temperature, ice, water, size }: Units) =>
  temperature === 'C' && ice === 'cm' && water === 'L' && size === 'm'

/** @param offered The person's units, then those of the chosen place. */
export function choicesOfUnits(offered: readonly Units[]): { units: Units; isMetric: boolean }[] {
  const metric = offered.findLast(isMetric) ?? METRIC
  const mixed = offered.filter((units) => !isMetric(units) && unitsCode(units) !== unitsCode(IMPERIAL))
  return [metric, IMPERIAL, ...mixed].map((units) => ({ units, isMetric: isMetric(units) }))
}
