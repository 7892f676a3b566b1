// The sign for the gate, over weather of any age.
import { renderToStaticMarkup } from 'react-dom/server'
import { expect, test } from 'vitest'
import { KeepOffSign } from '@/app/(member)/rinks/[rinkId]/freezing/_components/keep-off-sign'
import { freezingOutlook, type FreezingOutlook } from '@/lib/advice/freezing'
import type { FreezingView } from '@/lib/schemas/freezing-view'
import { METRIC } from '@/lib/units'
import { inputOf, steadyHours, timeOf } from '../../support/advice-weather'

const input = inputOf(steadyHours(96), { sheet: { thicknessMm: 110, temperatureC: -3, snowCoverCm: 0 } })
const outlook = freezingOutlook({ ...input, rink: { ...input.rink, phase: 'freezing' } }, { runs: 0 })
const forecast = {
  provider: 'test',
  issuedAt: null,
  fetchedAt: timeOf(-72),
  isStale: true,
  attribution: { text: 'Test weather', url: 'https://weather.example', licence: 'none' },
}
const view: FreezingView = {
  readAt: timeOf(0),
  rink: { id: '6d2b3d0a-6f5e-4c3b-9c56-0a4be1d0a0e1', name: 'Birch Lane', phase: 'freezing', carriesSkaterMm: 100 },
  reader: { timeZone: 'America/Toronto', units: METRIC, clock: '12', locale: 'en' },
  mayWrite: true,
  mayManage: true,
  outlook,
  forecast,
  lastReadFailed: true,
  sinceAt: null,
  reading: null,
  sheetMm: null,
  isDrilledThick: false,
}
const textOf = (markup: string) => markup.replace(/<[^>]+>/g, ' ').replace(/[\s\u00a0]+/g, ' ')
const signOf = (ice: FreezingOutlook, weather: 'fresh' | 'stale') =>
  textOf(renderToStaticMarkup(<KeepOffSign view={view} outlook={ice} weather={weather} />))

test('of eleven centimetres out of weather three days old it names that hour, and no thickness', () => {
  const sign = signOf(outlook, 'stale')
  expect(sign).toContain('read at noon on Sat 9 January')
  expect(sign).not.toMatch(/11\.\d cm/)
  expect(signOf(outlook, 'fresh')).toMatch(/Estimated at noon on Tuesday.*11\.\d cm of ice/)
})
