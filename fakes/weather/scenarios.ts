// The named scenarios: which night is tonight, and what the ten days after it bring.
import type { NightName } from './nights'

export interface Scenario {
  title: string
  /** What a keeper should see. */
  tells: string
  /** The night that has just been. */
  before: NightName
  /** Tonight first; after the last it starts over from the second. */
  nights: NightName[]
  /** The model ends so many hours from now; later values are null. */
  endsAfterHours?: number
}

// prettier-ignore
const mixedWeek: NightName[] = [
  'greyMild', 'coldDry', 'clearCold', 'windy', 'snowyEvening', 'thaw', 'wetThaw', 'coldDry', 'clearCold', 'coldAndCloudy',
]

// A table, kept in rows.
// prettier-ignore
export const SCENARIOS = {
  'clear-cold-night': {
    title: 'Clear cold night',
    tells: 'Down to -10 °C under clear sky and light wind until 2 am; snow from 5 am.',
    before: 'coldDry',
    nights: ['clearThenSnow', ...mixedWeek],
  },
  'cold-and-cloudy': {
    title: 'Cold and cloudy',
    tells: 'A low lid of cloud at -4 to -5 °C all night: it freezes, slowly.',
    before: 'coldAndCloudy',
    nights: [
      'coldAndCloudy', 'coldAndCloudy', 'snowyEvening', 'clearCold', 'greyMild', 'coldDry', 'windy', 'clearCold',
      'thaw', 'coldDry',
    ],
  },
  'snow-at-5am': {
    title: 'Snow at 5 am',
    tells: 'Cold, cloud by midnight, then more than 2 cm of snow an hour from 5 am.',
    before: 'coldDry',
    nights: [
      'cloudThenHeavySnow', 'snowyEvening', 'clearCold', 'coldDry', 'windy', 'greyMild', 'coldAndCloudy', 'clearCold',
      'thaw', 'coldDry',
    ],
  },
  'rain-into-freeze': {
    title: 'Rain into freeze',
    tells: 'Rain until 10 pm, the last of it freezing, then a sharp fall to -10 °C.',
    before: 'greyMild',
    nights: [
      'rainIntoFreeze', 'clearCold', 'coldDry', 'greyMild', 'thaw', 'coldDry', 'clearCold', 'windy', 'coldAndCloudy',
      'clearCold',
    ],
  },
  'thaw-three-days': {
    title: 'Thaw of three days',
    tells: 'Above zero day and night for three days, rain in the second; cold comes back after.',
    before: 'greyMild',
    nights: [
      'thaw', 'wetThaw', 'thaw', 'coldAndCloudy', 'clearCold', 'coldDry', 'clearCold', 'snowyEvening', 'windy',
      'coldDry',
    ],
  },
  'deep-cold': {
    title: 'Deep cold',
    tells: 'Near -30 °C, still and clear: layers crack and hoses freeze.',
    before: 'deepCold',
    nights: [
      'deepCold', 'deepCold', 'clearCold', 'coldDry', 'coldAndCloudy', 'snowyEvening', 'clearCold', 'windy',
      'greyMild', 'coldDry',
    ],
  },
  windy: {
    title: 'Wind',
    tells: 'Cold enough, but 10 m/s with gusts of 17 all night.',
    before: 'coldDry',
    nights: [
      'windy', 'coldDry', 'clearCold', 'greyMild', 'windy', 'clearCold', 'snowyEvening', 'coldDry', 'thaw', 'coldDry',
    ],
  },
  'gap-of-nulls': {
    title: 'Gap of nulls',
    tells: 'A clear cold night of which 8 pm, and 11 pm to 4 am, are missing; nothing after five days.',
    before: 'coldDry',
    nights: ['clearWithGaps', 'coldDry', 'greyMild', 'clearCold', 'windy'],
    endsAfterHours: 120,
  },
} satisfies Record<string, Scenario>

export type ScenarioName = keyof typeof SCENARIOS

export const DEFAULT_SCENARIO: ScenarioName = 'clear-cold-night'

export function isScenarioName(name: unknown): name is ScenarioName {
  return typeof name === 'string' && Object.hasOwn(SCENARIOS, name)
}
