// A fill and a freezing rink in words.
import { describe, expect, test } from 'vitest'
import { fillProgress, type FillProgressInput } from '@/lib/advice/fill-progress'
import { freezingOutlook } from '@/lib/advice/freezing'
import { METRIC } from '@/lib/units'
import * as filling from '@/lib/words/filling'
import {
  carriesName,
  freezingSentence,
  oldWeatherText,
  signEstimate,
  signTitle,
  snowOnIceText,
} from '@/lib/words/freezing'
import { inputOf, steadyHours } from '../../support/advice-weather'

const words = { timeZone: 'UTC', units: METRIC, clock: '24' as const, locale: 'en' }
const input: FillProgressInput = {
  now: '2026-12-20T21:00:00Z',
  lengthM: 10,
  widthM: 10,
  floor: { cornersM: [0, 0, 0.3, 0.3] },
  targetL: 15_000,
  sessions: [{ startedAt: '2026-12-20T18:00:00Z', stoppedAt: null, flowLPerMin: 25 }],
}

describe('filling', () => {
  test('the lead', () => {
    expect(filling.fillProgressSentence(fillProgress(input), words)).toBe(
      '4500 L in, 30 % of the fill. Done by 04:00 if the hose runs on.',
    )
    expect(filling.fillSpreadSentence(fillProgress(input), words)).toBe(
      'Water covers 55 % of the floor, 16.4 cm at the deepest.',
    )
    expect(filling.nextCheckSentence(fillProgress(input), words)).toMatch(/^Look now at hose and liner/)
  })
  test('off, and full', () => {
    const off = [{ startedAt: '2026-12-20T18:00:00Z', stoppedAt: '2026-12-20T20:00:00Z', flowLPerMin: 25 }]
    const sentence = filling.fillProgressSentence(fillProgress({ ...input, sessions: off }), words)
    expect(sentence).toBe('3000 L in, 20 % of the fill. 8 h of hose to go.')
    const full = fillProgress({ ...input, targetL: 4000 })
    expect(filling.fillProgressSentence(full, words)).toMatch(/turn the hose off/)
  })
  test('each warning', () => {
    const values = {
      riseMm: -8,
      expectedRiseMm: 30,
      lostLPerHour: 400,
      since: '2026-12-20T18:00:00Z',
      airTemperatureC: -6,
    }
    for (const code of filling.FILLING_CODES) {
      const text = filling.fillWarningText(
        { code, values: { ...values, startsAt: '2026-12-20T23:00:00Z', minutesToIce: 14 } },
        words,
      )
      expect(text).toMatch(/\.$/)
      expect(text).not.toMatch(/NaN|undefined/)
    }
    expect(filling.fillWarningText({ code: 'level_falls', values }, words)).toContain('fallen 8 mm since 18:00')
  })
})

describe('freezing', () => {
  const given = inputOf(steadyHours(96, { airTemperatureC: -10 }), {
    sheet: { thicknessMm: 40, temperatureC: -3, snowCoverCm: 3 },
  })
  const outlook = freezingOutlook({ ...given, rink: { ...given.rink, phase: 'freezing' } }, { runs: 0 })
  test('how thick and when', () => {
    const text = freezingSentence(outlook, new Date(given.now), words)
    expect(text).toMatch(/^4\.0 cm of ice on 8\.3 cm of water\. 10\.0 cm to carry a skater: /)
  })
  test('a sheet that carries still asks for the drill', () => {
    const thick = { ...outlook, now: { ...outlook.now, thicknessMm: 110 } }
    expect(freezingSentence(thick, new Date(given.now), words)).toContain('drill before anyone skates')
  })
  test('where there is too little water for the thickness wanted, it carries once frozen to the floor', () => {
    // 3 cm of water make 3.3 cm of ice.
    const water = { ...given.water, fillDepthMm: 30 }
    const sheet = { thicknessMm: 0, temperatureC: 0, snowCoverCm: 0 }
    const shallow = freezingOutlook({ ...given, water, sheet, rink: { ...given.rink, phase: 'freezing' } }, { runs: 0 })
    expect(shallow.carriesSkaterAt).toEqual(shallow.frozenThroughAt)
    const text = freezingSentence(shallow, new Date(given.now), words)
    expect(text).toMatch(
      /^No ice yet on 3\.0 cm of water\. Too little water for 10\.0 cm of ice, so .* frozen to the floor: /,
    )
    expect(carriesName(shallow, words)).toBe('Carries a skater, frozen to the floor')
    expect(carriesName(outlook, words)).toBe('Carries a skater, 10.0 cm')
  })
  // 22 mm with no water left is all the ice that the fill makes, so it is at its limit though short of 100 mm.
  const onFloor = { ...outlook, isShallow: true, now: { ...outlook.now, thicknessMm: 22, waterBelowMm: 0 } }
  test('a shallow fill that is frozen through has reached what it can', () => {
    expect(freezingSentence(onFloor, new Date(given.now), words)).toBe(
      '2.2 cm of ice, frozen through. By the model it carries: drill before anyone skates.',
    )
  })
  test('the sign for the gate: thin while it is thin; from the limit of 100 mm on closed, but not thin', () => {
    const at = (thicknessMm: number) => ({ ...outlook, now: { ...outlook.now, thicknessMm } })
    expect([signTitle(at(99)), signTitle(at(100)), signTitle(at(115)), signTitle(onFloor)]).toEqual([
      'Keep off: thin ice',
      'Keep off until it is opened',
      'Keep off until it is opened',
      'Keep off until it is opened',
    ])
    expect(signEstimate(at(41), words)).toBe('4.1 cm of ice with water under it. It wants 10.0 cm to carry a skater.')
    expect(signEstimate(at(115), words)).toBe('11.5 cm of ice with water under it.')
    expect(signEstimate(onFloor, words)).toBe('2.2 cm of ice.')
    const shallow = { ...at(12), isShallow: true }
    expect(signEstimate(shallow, words)).toContain('It has to freeze to the floor to carry a skater.')
  })
  test('from old weather no ice is said to carry, on the page or at the gate', () => {
    const thick = { ...outlook, now: { ...outlook.now, thicknessMm: 115 } }
    for (const reached of [thick, onFloor]) {
      const said = [
        freezingSentence(reached, new Date(given.now), words, 'stale'),
        signTitle(reached, 'stale'),
        signEstimate(reached, words, 'stale'),
      ].join(' ')
      expect(said).toContain('drill before anyone skates')
      expect(said).toContain('Keep off: nobody knows the ice')
      expect(said).not.toMatch(/it carries|opened/)
    }
    expect(signEstimate(thick, words, 'stale')).toBe('')
    expect(signTitle(outlook, 'stale')).toBe('Keep off: thin ice')
    // 9 January 2027 is a Saturday.
    expect(oldWeatherText('2027-01-09T11:05:00Z', words)).toBe(
      'The weather behind this was read at 11:05 on Sat 9 January; none newer could be had.',
    )
  })
  test('every word about snow', () => {
    expect(outlook.snow.length).toBeGreaterThan(1)
    for (const caution of outlook.snow) expect(snowOnIceText(caution, words)).toMatch(/\.$/)
  })
  // 20 January 2027 is a Wednesday.
  test('weekdays keep their capital after the colon', () => {
    const wednesday = { p10: '2027-01-20T18:00:00Z', p50: '2027-01-20T18:00:00Z', p90: '2027-01-20T18:00:00Z' }
    const text = freezingSentence({ ...outlook, carriesSkaterAt: wednesday }, new Date(given.now), words)
    expect(text).toMatch(/10\.0 cm to carry a skater: Wednesday evening\.$/)
    const never = freezingSentence(
      { ...outlook, carriesSkaterAt: { p10: null, p50: null, p90: null } },
      new Date(given.now),
      words,
    )
    expect(never).toMatch(/to carry a skater: not within the forecast\.$/)
  })
  test('of snow on ice that is not there no thickness is told', () => {
    const values = { thicknessMm: 0, bornCm: 0, bearsMm: 50, snowfallCm: 4, snowCoverCm: 2, growthShare: 0.5 }
    const say = (code: string) =>
      snowOnIceText({ code, values: { ...values, startsAt: '2027-01-13T17:00:00Z' } }, words)
    expect(say('snow_due_will_flood')).toBe(
      '4.0 cm of snow is due from Wednesday 17:00, and no ice is there to hold it: expect it to sink into the water and freeze as slush.',
    )
    for (const code of ['snow_floods_ice', 'leave_snow', 'snow_due_will_flood'])
      expect(say(code)).not.toContain('0.0 cm')
  })
  test('a spread in words', () => {
    const now = new Date('2026-12-20T12:00:00Z')
    const at = (day: number) => `2026-12-${day}T18:00:00Z`
    expect(filling.spreadText({ p10: at(22), p50: at(23), p90: at(24) }, now, words)).toBe(
      'Wednesday evening; from Tuesday evening to Thursday evening over the forecast runs',
    )
    expect(filling.spreadText({ p10: at(22), p50: at(23), p90: null }, now, words)).toBe(
      'Wednesday evening, or later than the forecast reaches',
    )
    expect(filling.spreadText({ p10: null, p50: null, p90: null }, now, words)).toBe('not within the forecast')
  })
  test('what the estimate has reached is not told as to come', () => {
    const now = new Date('2026-12-20T12:00:00Z')
    const reached = { p10: '2026-12-20T12:00:00Z', p50: '2026-12-20T12:00:00Z', p90: '2026-12-20T12:00:00Z' }
    expect(filling.spreadText(reached, now, words)).toBe('by the model already')
    // The middle run gets there in an hour: that is still to come.
    const soon = '2026-12-20T13:00:00Z'
    expect(filling.spreadText({ p10: soon, p50: soon, p90: soon }, now, words)).toBe('this afternoon')
  })
})
