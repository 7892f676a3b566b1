// What each settings page says now, in a line.
import { PHASE_WORDS, WATER_WORDS } from '@/components/rinks/choice-words'
import { skyPercent } from '@/components/rinks/form/settings-values'
import { BASE_CHOICES, SHELTER_CHOICES } from '@/components/rinks/form/yard-fields'
import type { RinkSettings } from '@/lib/services/rink-settings'
import type { WordOptions } from '@/lib/words/options'
import { clockText } from '@/lib/words/times'
import { flowText, iceText, sizeText, windChillText, windText } from '@/lib/words/quantities'

const DAY_NAMES = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun']

const labelOf = (choices: readonly { value: string; label: string }[], value: string) =>
  choices.find((choice) => choice.value === value)?.label ?? value

export function summaries(rink: RinkSettings, words: WordOptions): { path: string; word: string; says: string }[] {
  const others = rink.sources.length - 1
  const water = `${WATER_WORDS[rink.water.kind]}, ${flowText(rink.water.flowLPerMin, words)}`
  return [
    { path: 'ice', word: 'Ice now', says: PHASE_WORDS[rink.phase] },
    { path: 'water', word: 'Water', says: others > 0 ? `${water}; ${others} more` : water },
    { path: 'hours', word: 'Hours', says: rink.available.map((hours) => hoursText(hours, words)).join('; ') },
    { path: 'limits', word: 'Limits', says: limitsText(rink, words) },
    { path: 'yard', word: 'Size, floor and shelter', says: yardText(rink, words) },
    {
      path: 'place',
      word: 'Name, place and clock',
      says: `${rink.name}, ${rink.placeName}; clock of ${rink.timeZone}`,
    },
  ]
}

function hoursText({ from, to, weekdays }: RinkSettings['available'][number], words: WordOptions): string {
  const days = weekdays.length === 7 ? 'every day' : weekdays.map((day) => DAY_NAMES[day - 1]).join(', ')
  // A wall time has no date: any day of UTC tells how its hour is written.
  const [start, end] = [from, to].map((time) => clockText(`2026-01-01T${time}:00Z`, { ...words, timeZone: 'UTC' }))
  return `${start} to ${end} ${days}`
}

function limitsText({ windLimitMps, windChillLimitC, carriesSkaterMm }: RinkSettings, words: WordOptions): string {
  const limits = [
    windLimitMps === null ? [] : [`wind to ${windText(windLimitMps, words)}`],
    windChillLimitC === null ? [] : [`wind chill to ${windChillText(windChillLimitC, words)}`],
    [`skaters from ${iceText(carriesSkaterMm, words)}`],
  ].flat()
  const text = limits.join(', ')
  return text.charAt(0).toUpperCase() + text.slice(1)
}

function yardText({ lengthM, widthM, base, shelter, skyView, floor }: RinkSettings, words: WordOptions): string {
  const size = `${sizeText(lengthM, words)} by ${sizeText(widthM, words)}`
  const ground = floor ? 'floor measured' : 'level floor'
  return `${size}; ${labelOf(BASE_CHOICES, base).toLowerCase()}, ${ground}; ${labelOf(SHELTER_CHOICES, shelter).toLowerCase()}, ${skyPercent(skyView)} of the sky`
}
