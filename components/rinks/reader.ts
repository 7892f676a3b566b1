// How the reader of a night sheet wants figures, and how old things are.
import { MINUTE_MILLIS } from '@/lib/physics/constants'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { wordsFor, type WordOptions } from '@/lib/words/options'

export { dayText, nightLabel, shortDayText } from '@/lib/words/night-label'

interface Reader {
  viewer: Pick<TonightView['viewer'], 'units' | 'clock'>
  rink: Pick<TonightView['rink'], 'timeZone'>
}

/** Units and clock are the person's; times are told in the rink's zone. */
export function readerOf({ viewer, rink }: Reader): WordOptions {
  return wordsFor(viewer, rink.timeZone)
}

/** How long ago, in the largest unit that fits. */
export function ageText(from: string, now: number): string {
  const minutes = Math.max(0, Math.round((now - Date.parse(from)) / MINUTE_MILLIS))
  if (minutes < 1) return 'just now'
  if (minutes < 60) return `${minutes} ${minutes === 1 ? 'minute' : 'minutes'} ago`
  const hours = Math.round(minutes / 60)
  if (hours < 48) return `${hours} ${hours === 1 ? 'hour' : 'hours'} ago`
  return `${Math.round(hours / 24)} days ago`
}
