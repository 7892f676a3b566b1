// The sentence at the head of the alerts page, and times of day as the person reads them.
import { dayText } from '@/components/rinks/reader'
import { countText } from '@/lib/words/quantities'
import type { AlertSettings } from '@/lib/services/alert-preferences'

/** "3:30 pm", "15:30": a time of day has no date and no zone. */
export function timeOfDayText(time: string, clock: '12' | '24'): string {
  const [hours = 0, minutes = 0] = time.split(':').map(Number)
  if (clock === '24') return time
  const half = hours < 12 ? 'am' : 'pm'
  return `${hours % 12 || 12}${minutes ? `:${String(minutes).padStart(2, '0')}` : ''}\u00a0${half}`
}

/** What holds now, in one sentence. */
export function standingText({ preferences, tonightDate, devices, clock }: AlertSettings): string {
  const { mutedThroughDate, wantsEmail, wantsPush, tellAt } = preferences
  if (mutedThroughDate && mutedThroughDate >= tonightDate) {
    return mutedThroughDate === tonightDate
      ? 'Silent tonight.'
      : `Silent through the night of ${dayText(mutedThroughDate)}.`
  }
  const count = wantsPush ? devices.filter(({ disabledReason }) => disabledReason === null).length : 0
  const ways = [
    ...(count > 0 ? [`on ${countText(count)} ${count === 1 ? 'device' : 'devices'}`] : []),
    ...(wantsEmail ? ['by e-mail'] : []),
  ]
  if (ways.length === 0) return 'You are not told about this rink.'
  return `On a good day you are told at ${timeOfDayText(tellAt, clock)}, ${ways.join(' and ')}.`
}
