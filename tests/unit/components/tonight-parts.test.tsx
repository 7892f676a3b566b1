// Parts of the night sheet: who gets which entries, the verdict set off, and what is said when the state may be old.
import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test } from 'vitest'
import { entriesFor, entryOf } from '@/app/(member)/_components/navigation'
import { DataSource } from '@/components/rinks/data-source'
import { passWords, setWords } from '@/app/(member)/rinks/[rinkId]/_components/pass-words'
import { hasMoreToLose, isAsked } from '@/app/(member)/rinks/[rinkId]/_components/when-asked'
import { PhaseNote } from '@/app/(member)/rinks/[rinkId]/_components/phase-note'
import { StatusNotices } from '@/app/(member)/rinks/[rinkId]/_components/status-notices'
import { TroubleBar } from '@/app/(member)/rinks/[rinkId]/_components/trouble-bar'
import type { ReadTrouble } from '@/app/(member)/rinks/[rinkId]/_components/use-tonight'
import { Verdict } from '@/app/(member)/rinks/[rinkId]/_components/verdict'
import { ageText, nightLabel, readerOf } from '@/components/rinks/reader'
import type { Role } from '@/lib/access/permissions'
import type { Phase } from '@/lib/advice/types'
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import type { PouredPassView, TonightView } from '@/lib/schemas/tonight-view'
import { isoAt, NOON, passAt, summaryOf, tonightView } from '../../fixtures/tonight-view'

const NOW = NOON + 6.7 * HOUR_MILLIS
const textOf = (markup: string) => markup.replace(/<[^>]+>/g, '').replaceAll('\u00a0', ' ')

describe('navigation', () => {
  const entries = entriesFor('1', 'keeper')

  test('leads round one rink', () => {
    expect(entries.map(({ word }) => word)).toEqual(['Tonight', 'Week', 'Log', 'More'])
  })

  test('shows nothing of a rink that is not on the person’s list', () => {
    expect(entriesFor('1', undefined)).toEqual(entriesFor(undefined, undefined))
  })

  test.each([
    ['/rinks/1', 'Tonight'],
    ['/rinks/1/log', 'Log'],
    ['/rinks/1/log/2', 'Log'],
    ['/rinks/1/plan', 'More'],
    ['/rinks/1/settings', 'More'],
  ])('%s belongs to %s', (pathname, word) => {
    expect(entryOf(pathname, entries)?.word).toBe(word)
  })
})

test('the verdict sets off its first words and keeps times of day on one line', () => {
  const markup = renderToStaticMarkup(<Verdict view={tonightView()} summary={summaryOf()} now={NOW} />)
  expect(markup).toContain('<em class="font-semibold not-italic text-lamp-text">Flood tonight</em>')
  expect(markup).toContain('7\u00a0pm')
  expect(textOf(markup)).toContain('27 of 30 forecast runs agree.')
})

describe('a state that may be old', () => {
  const say = (change: Partial<TonightView>) =>
    textOf(renderToStaticMarkup(<StatusNotices view={tonightView(change)} now={NOW} />))
  const sayTrouble = (trouble: NonNullable<ReadTrouble>, now = NOW) =>
    textOf(renderToStaticMarkup(<TroubleBar view={tonightView()} now={now} trouble={trouble} onReadAgain={() => {}} />))

  test('is silent while all is fresh', () => {
    expect(say({})).toBe('')
  })

  test('says as of when, and how long ago, without a connection', () => {
    expect(sayTrouble('offline', NOW + 3 * HOUR_MILLIS)).toContain('No connection. As of 6:42 pm, 3 hours ago.')
  })

  test('sends a signed-out person to sign-in', () => {
    expect(sayTrouble('signed-out')).toMatch(/You are signed out on this device\. As of .*Sign in$/)
  })

  test('gives a stale forecast its age, and does not repeat that the last read failed', () => {
    const forecast = { ...tonightView().forecast, isStale: true, fetchedAt: isoAt(-1) } as TonightView['forecast']
    const said = say({ forecast, lastReadFailed: true })
    expect(said).toContain('This forecast was read 8 hours ago')
    expect(said).not.toContain('The last try')
  })
})

const POURED: PouredPassView = {
  at: isoAt(8),
  by: 'Ann',
  entry: { id: '6d2b3d0a-6f5e-4c3b-9c56-0a4be1d0a0e1', version: 1 },
  saidSetByAt: isoAt(9.6),
  outcome: null,
  outcomeAt: null,
}

describe('whether a poured pass is set', () => {
  const view = tonightView()
  const at = (hours: number) => NOON + hours * HOUR_MILLIS

  test('keep off until it should be set; from then on the page asks', () => {
    expect(setWords(POURED, at(9), readerOf(view))).toBe('Keep off until 9:40 pm.')
    expect(isAsked(POURED, at(9))).toBe(false)
    expect(setWords(POURED, at(9.7), readerOf(view))).toBe('')
    expect(isAsked(POURED, at(9.7))).toBe(true)
  })

  test('taking it out asks first once it was answered for or changed', () => {
    expect(hasMoreToLose(POURED)).toBe(false)
    expect(hasMoreToLose({ ...POURED, entry: null })).toBe(false)
    expect(hasMoreToLose({ ...POURED, outcome: 'set', outcomeAt: isoAt(10) })).toBe(true)
    expect(hasMoreToLose({ ...POURED, entry: { ...POURED.entry!, version: 2 } })).toBe(true)
  })

  test('a pass that no hour of the forecast sets keeps people off', () => {
    expect(setWords({ ...POURED, saidSetByAt: null }, at(9), readerOf(view))).toMatch(/^Keep off/)
  })

  test('found set or spoiled is the last word; found wet is asked again after half an hour', () => {
    const wet = { ...POURED, outcome: 'wet', outcomeAt: isoAt(9.75) } as const
    expect(setWords(wet, at(9.8), readerOf(view))).toBe('Still wet at 9:45 pm: keep off.')
    expect([at(10), at(10.25)].map((now) => isAsked(wet, now))).toEqual([false, true])
    expect(isAsked({ ...wet, outcome: 'set' }, at(20))).toBe(false)
  })

  test('nothing is asked of a check-off that the server does not have yet', () => {
    expect(isAsked({ ...POURED, entry: null }, at(20))).toBe(false)
  })
})

test('warmer water than usual, and a pass that does not set, are said', () => {
  const view = tonightView()
  const moved = { ...passAt(3, 12, 13.7), temperatureC: 45, setBy: null }
  expect(passWords(moved, view)).toEqual({
    what: '3 mm over the whole sheet, water at 45 °C',
    detail: '420 L, 17 min of hose; not set within the forecast',
  })
})

test('a poured pass says by whom, a planned one when it is set', () => {
  const view = tonightView()
  const planned = passAt(1, 8, 9.7)
  expect(passWords(planned, view)).toEqual({
    what: '3 mm over the whole sheet',
    detail: '420 L, 17 min of hose; set by 9:45 pm',
  })
  expect(passWords({ ...planned, poured: POURED }, view).detail).toBe('420 L, poured by Ann')
})

test('the source is named with its licence and linked', () => {
  const markup = renderToStaticMarkup(<DataSource view={tonightView()} now={NOW} />)
  expect(markup).toContain('href="https://open-meteo.com/"')
  expect(textOf(markup)).toContain('Forecast issued 5 pm, read 5:12 pm, 2 hours ago')
  expect(textOf(markup)).toContain('CC BY 4.0')
})

test('nights are named by both their dates, ages by their largest unit', () => {
  expect(nightLabel('2027-01-12')).toBe('Tue 12 to Wed 13 January')
  expect(nightLabel('2027-01-31')).toBe('Sun 31 January to Mon 1 February')
  expect(
    [0, 1, 59, 61, 60 * 47, 60 * 72].map((minutes) =>
      ageText(new Date(NOW - minutes * MINUTE_MILLIS).toISOString(), NOW),
    ),
  ).toEqual(['just now', '1 minute ago', '59 minutes ago', '1 hour ago', '47 hours ago', '3 days ago'])
})

describe('what the rink is at', () => {
  const note = (phase: Phase, role: Role, isFloodNight = true) => {
    const rink = { ...tonightView().rink, phase }
    return textOf(renderToStaticMarkup(<PhaseNote rink={rink} role={role} isFloodNight={isFloodNight} />))
  }

  test('who comes to skate reads whether it is open; who floods has the plan', () => {
    expect(note('skating', 'skater')).toContain('Open for skating, by its keeper’s word')
    expect(note('skating', 'keeper')).toBe('')
  })

  test('in a thaw everybody stays off; once the cold is back its keeper is led to say so', () => {
    expect(note('thaw', 'keeper', false)).toContain('Stay off')
    expect(note('thaw', 'keeper')).toMatch(/the cold is back.*Say what there is now$/)
    expect(note('thaw', 'crew')).toMatch(/the cold is back.*The week to come$/)
  })
})
