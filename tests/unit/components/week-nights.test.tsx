// The nights ahead as the server sends them: complete before any script, in words beside the bars, nothing the CSP drops.
import { renderToStaticMarkup } from 'react-dom/server'
import { expect, test } from 'vitest'
import { barScale, barsOf } from '@/app/(member)/rinks/[rinkId]/week/_components/bar-scale'
import { FillAhead } from '@/app/(member)/rinks/[rinkId]/week/_components/fill-ahead'
import { NightList } from '@/app/(member)/rinks/[rinkId]/week/_components/night-list'
import { WithoutNights } from '@/app/(member)/rinks/[rinkId]/week/_components/without-nights'
import { DAY_MILLIS, HOUR_MILLIS } from '@/lib/physics/constants'
import type { WeekNight, WeekView } from '@/lib/schemas/week-view'
import { METRIC } from '@/lib/units'
import { hourAt, WINDOW } from '../../fixtures/tonight-view'

const READER = { timeZone: 'America/Toronto', units: METRIC, clock: '12', locale: 'en' } as const

/** Night `index` from Tuesday 12 January 2027, an hour a bar at 1 mm/h. */
function nightAt(index: number, change: Partial<WeekNight> = {}): WeekNight {
  const noon = Date.parse('2027-01-12T17:00:00Z') + index * DAY_MILLIS
  const iso = (millis: number) => new Date(millis).toISOString().replace('.000Z', 'Z')
  return {
    nightDate: iso(noon).slice(0, 10),
    startsAt: iso(noon),
    endsAt: iso(noon + DAY_MILLIS),
    verdict: 'hold',
    isFar: index >= 3,
    window: null,
    agreement: null,
    passes: null,
    weatherMm: -0.4,
    floodsMm: 0,
    freezableMm: 24,
    lowC: -6,
    highC: -1,
    falls: null,
    snowToClearCm: 0,
    reason: { code: 'not_freezing', factor: 0, values: { airTemperatureC: 1 } },
    thaw: null,
    forecastEndsAt: null,
    sunsetAt: iso(noon + 4.7 * HOUR_MILLIS),
    sunriseAt: iso(noon + 19.7 * HOUR_MILLIS),
    bars: Array.from({ length: 24 }, (_, hour) => ({
      startsAt: iso(noon + hour * HOUR_MILLIS),
      verdict: 'hold' as const,
      freezeRateMmPerH: 1,
    })),
    ...change,
  }
}

function viewOf(nights: WeekNight[], change: Partial<NonNullable<WeekView['outlook']>> = {}) {
  const spread = { p10: '2027-01-18T12:00:00Z', p50: '2027-01-19T12:00:00Z', p90: null }
  const outlook: NonNullable<WeekView['outlook']> = {
    judgedAt: '2027-01-12T20:00:00Z',
    modelVersion: 'test',
    nights,
    summary: {
      nights: nights.length,
      goodDates: [],
      goodBeforeThaw: 0,
      goodAfterThaw: 0,
      thaw: null,
      isThawOn: false,
      nearGoodDates: [],
      nearFloodsMm: 0,
      thinnest: null,
    },
    fill: { startsAt: '2027-01-14T15:00:00Z', hoseHours: 8.5, litres: 12_000, skinAt: null, carriesSkaterAt: spread },
    fillWindows: [{ ...WINDOW, kind: 'fill', agreement: 0.8, runs: 20 }],
    open: null,
    ...change,
  }
  const view: WeekView = {
    readAt: '2027-01-12T20:10:00Z',
    rink: {
      id: '4b0cbb0e-6f5e-4c3b-9c56-0a4be1d0a001',
      name: 'Cedar Court',
      timeZone: 'America/Toronto',
      phase: 'skating',
    },
    viewer: { units: METRIC, clock: '12' },
    outlook,
    forecast: null,
    lastReadFailed: false,
  }
  return { view, outlook }
}

function list(nights: WeekNight[], change: Partial<NonNullable<WeekView['outlook']>> = {}): string {
  const { view, outlook } = viewOf(nights, change)
  return renderToStaticMarkup(<NightList view={view} outlook={outlook} reader={READER} />)
}

test('the line between deciding and planning stands after the third night, and later nights are fainter', () => {
  const markup = list(Array.from({ length: 5 }, (_, index) => nightAt(index)))
  const rows = markup.split('<li')
  expect(
    rows
      .map((row) => (row.includes('More than three days out') ? 'line' : row.includes('opacity-55') ? 'far' : 'near'))
      .slice(1),
  ).toEqual(['near', 'near', 'near', 'line', 'far', 'far'])
})

test('a verdict is a word, and what was not compared says so', () => {
  const markup = list([nightAt(0), nightAt(1, { verdict: 'thaw', agreement: { agreeing: 3, runs: 20 } })])
  for (const words of ['Hold off', 'Thaw', 'not compared', '3 of 20 runs', '−0.4 mm']) expect(markup).toContain(words)
  expect(markup).not.toMatch(/ style="/)
})

test('an opened night brings its strip and its table, and its link closes it', () => {
  const hours = Array.from({ length: 24 }, (_, index) => hourAt(index))
  const markup = list([nightAt(0), nightAt(1)], { open: { nightDate: '2027-01-12', hours } })
  expect(markup).toContain('How fast water freezes, hour by hour')
  // A head and 24 hours.
  expect(markup.match(/<tr/g)).toHaveLength(25)
  expect(markup.match(/aria-expanded="true"/g)).toHaveLength(1)
  expect(markup.match(/\?night=/g)).toHaveLength(1)
  expect(markup).not.toMatch(/ style="/)
})

test('bars share one scale, hang under the line when it melts, and are cut where the frame ends', () => {
  const bars = [1, -0.5, -9, null].map((freezeRateMmPerH, hour) => ({
    startsAt: new Date(Date.parse('2027-01-12T17:00:00Z') + hour * HOUR_MILLIS).toISOString(),
    verdict: 'hold' as const,
    freezeRateMmPerH,
  }))
  const night = nightAt(0, { bars })
  // The scale's least top of 2.5 mm/h with a twentieth of room: 1 mm/h is 30/2.625 = 11.4 of 30 high.
  const drawn = barsOf(night, barScale([night]))
  expect(drawn).toHaveLength(3)
  expect(drawn[0]).toMatchObject({ height: 11.4, y: 18.6, isCut: false })
  expect(drawn[1]).toMatchObject({ height: 5.7, y: 30, isCut: false })
  expect(drawn[2]).toMatchObject({ height: 13, y: 30, isCut: true })
})

test('while waiting, the fill has its start, hose, dates by runs, and times to start', () => {
  const { outlook } = viewOf([nightAt(0)])
  const markup = renderToStaticMarkup(<FillAhead outlook={outlook} reader={READER} />)
  for (const words of [
    'Thu 14 January, 10 am',
    '8 h 30 min, 12,000 L',
    'about Tue 19 January (Mon 18 January to later)',
    'not within the forecast',
    '16 of 20 runs',
  ])
    expect(markup).toContain(words)
})

test('without nights the page says what happened and what to do', () => {
  const { view } = viewOf([])
  const words = (change: Partial<WeekView>) => renderToStaticMarkup(<WithoutNights view={{ ...view, ...change }} />)
  expect(words({ rink: { ...view.rink, phase: 'closed' } })).toContain('Closed for the season.')
  expect(words({ outlook: null })).toContain('Reading the first forecast.')
  expect(words({ outlook: null, lastReadFailed: true })).toContain('could not be read')
  expect(words({})).toContain('The forecast has run out.')
})
