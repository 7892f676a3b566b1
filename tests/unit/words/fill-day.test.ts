// The day to fill in words: dates that hold when read later, figures as people read them, and no figure that is none.
import { describe, expect, test } from 'vitest'
import type { AdviceWindow, FillOutlook } from '@/lib/advice/types'
import { fillDayMail, fillDayPush } from '@/lib/messaging/templates/fill-day'
import { IMPERIAL, METRIC } from '@/lib/units'
import { fillDayText, type FillDayNews } from '@/lib/words/fill-day'
import { wordsFor } from '@/lib/words/options'
import { datedPartText } from '@/lib/words/times'

const NOW = new Date('2027-01-12T21:10:00Z')
const STARTS_AT = '2027-01-14T22:00:00Z'
const words = wordsFor({ units: METRIC, clock: '12' }, 'America/Toronto')
const never = { p10: null, p50: null, p90: null }

const fill: FillOutlook = {
  startsAt: STARTS_AT,
  hoseHours: 8.2,
  litres: 12_345,
  skinAt: null,
  carriesSkaterAt: { ...never, p50: '2027-01-18T02:00:00Z' },
  sessions: [
    { startsAt: STARTS_AT, endsAt: '2027-01-15T04:00:00Z', litres: 9000 },
    { startsAt: '2027-01-15T22:00:00Z', endsAt: '2027-01-16T00:14:00Z', litres: 3345 },
  ],
}
const window = {
  kind: 'fill',
  startsAt: '2027-01-14T21:00:00Z',
  endsAt: '2027-01-15T04:00:00Z',
  latestStartAt: '2027-01-15T03:00:00Z',
  setBy: '2027-01-15T12:00:00Z',
  score: 70,
  agreement: 20 / 24,
  runs: 24,
} satisfies AdviceWindow

function say(changes: Partial<FillDayNews> = {}, how = words) {
  const day = { fillDate: '2027-01-14', startsAt: new Date(STARTS_AT) }
  const news: FillDayNews = {
    kind: 'fill-ahead',
    day,
    before: null,
    fill,
    windows: [window],
    base: 'liner',
    ...changes,
  }
  return fillDayText(news, NOW, how)
}

describe('a day to fill', () => {
  test('names the day by its date, how sure, how much, and when skaters', () => {
    expect(say()).toMatchObject({
      sentence: 'Fill Thursday evening, 14 January.',
      before: '',
      sure: '20 of 24 forecast runs agree.',
      plan: 'Best start 5 pm: about 12,345 L and 8 h of hose in two turns. Skaters from about Sun 17 January.',
    })
    expect(say().caveat).toContain('no decision yet')
  })

  test('speaks the person’s units and clock', () => {
    const { plan } = say({}, wordsFor({ units: IMPERIAL, clock: '24' }, 'America/Toronto'))
    // 12,345 L are 3261 US gallons of 3.785 L.
    expect(plan).toContain('Best start 17:00: about 3261 gal')
  })

  test('a forecast that ends before the ice carries says so, and windows without runs say nothing of them', () => {
    const { plan, sure } = say({ fill: { ...fill, carriesSkaterAt: never, sessions: undefined }, windows: [] })
    expect(plan).toBe(
      'Best start 5 pm: about 12,345 L and 8 h of hose. The forecast ends before the ice carries skaters.',
    )
    expect(sure).toBe('')
  })

  test.each(['liner', 'ground', 'snow'] as const)(
    'on %s has what to have ready, without a liner where there is none',
    (base) => {
      const ready = say({ base }).ready.join(' ')
      expect(ready).toContain('backflow preventer')
      expect(/liner/i.test(ready)).toBe(base === 'liner')
      expect(say({ base, kind: 'fill-closed' }).before.includes('liner')).toBe(base === 'liner')
    },
  )

  test('a move and a return say what they take the place of', () => {
    const before = { kind: 'fill-ahead' as const, startsAt: new Date('2027-01-13T22:00:00Z') }
    expect(say({ kind: 'fill-changed', before }).before).toContain('Wednesday evening, 13 January')
    expect(say({ kind: 'fill-changed', before: { ...before, kind: 'fill-closed' } }).before).toContain('to hold off')
  })

  test('a closing says to hold off, and has no plan', () => {
    expect(say({ kind: 'fill-closed' })).toMatchObject({
      sentence: 'Hold off filling: Thursday evening, 14 January, no longer holds.',
      plan: '',
      ready: [],
    })
  })

  test.each([
    ['2027-01-15T03:00:00Z', 'Thursday night, 14 January'],
    ['2027-01-15T07:00:00Z', 'Thursday night, 14 January'],
    ['2027-01-15T13:00:00Z', 'Friday morning, 15 January'],
  ])('%s is %s in Toronto', (at, text) => {
    expect(datedPartText(at, words)).toBe(text)
  })
})

describe('its messages', () => {
  const letter = (kind: FillDayNews['kind'], rinkName = 'New Boards') => ({
    rinkName,
    nightLabel: 'Thu 14 to Fri 15 January',
    ...say({ kind }),
    cautions: ['Keep hose water off pavements and steps.'],
    weekUrl: 'https://nightsheet.test/rinks/1/week',
    unsubscribeUrl: 'https://nightsheet.test/api/unsubscribe?token=abc',
    manageUrl: 'https://nightsheet.test/rinks/1/alerts',
  })

  test.each(['fill-ahead', 'fill-changed', 'fill-closed'] as const)('%s says all of it in text and HTML', (kind) => {
    const content = letter(kind)
    const { text, html } = fillDayMail(kind, content)
    for (const part of [content.sentence, content.sure, content.caveat, ...content.ready, ...content.cautions]) {
      expect(text).toContain(part)
    }
    for (const url of [content.weekUrl, content.unsubscribeUrl, content.manageUrl]) {
      expect(text).toContain(url)
      expect(html).toContain(`href="${url}"`)
    }
    expect(text).not.toContain('!')
  })

  test('a name is shown and not obeyed, and the push stays short', () => {
    const hostile = `<script>\r\nBcc: x${'x'.repeat(300)}`
    expect(fillDayMail('fill-ahead', letter('fill-ahead', hostile)).html).not.toContain('<script')
    expect(fillDayMail('fill-ahead', letter('fill-ahead', hostile)).subject).not.toMatch(/[\r\n]/)
    const push = fillDayPush('fill-ahead', letter('fill-ahead', hostile), 'fill-day:1')
    expect(push.title).not.toMatch(/[\r\n]/)
    expect(push.body.length).toBeLessThanOrEqual(180)
  })
})
