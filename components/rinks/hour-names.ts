// Names of hours by the rink's clock; of an hour that the clock shows twice, the second is named so.
import type { WordOptions } from '@/lib/words/options'
import { clockText } from '@/lib/words/times'

/** One name for each hour, in order: "1 am", then "1 am again" on the night the clocks go back. */
export function hourNames(hours: readonly { time: string }[], reader: WordOptions): string[] {
  const names = hours.map(({ time }) => clockText(time, reader))
  return names.map((name, index) => (index > 0 && names[index - 1] === name ? `${name} again` : name))
}
