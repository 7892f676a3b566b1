// The strip as the server sends it: complete before any script, the same numbers in the table, nothing the CSP would drop.
import { IMPERIAL } from '@/lib/units'
import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, test } from 'vitest'
import { NightStrip } from '@/components/rinks/night-strip'
import type { StripSource } from '@/components/rinks/strip-input'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { hourAt, isoAt, NOON, outlookOf, passAt, tonightView } from '../../fixtures/tonight-view'

function draw(change: Partial<TonightView> = {}, now = NOON + 6.7 * HOUR_MILLIS): string {
  return renderToStaticMarkup(<NightStrip source={tonightView(change) as StripSource} now={now} />)
}

const rowsOf = (markup: string) =>
  [...markup.matchAll(/<tr>(.*?)<\/tr>/g)].map(([, row]) =>
    [...(row ?? '').matchAll(/<t[hd][^>]*>(.*?)<\/t[hd]>/g)].map(([, cell]) => cell ?? ''),
  )

// Clocks in Toronto go back at 2 am on 1 November 2026, forward at 2 am on 14 March 2027; noon is 16:00 UTC in summer, 17:00 in winter.
describe.each([
  {
    name: 'back',
    startsAt: '2026-10-31T16:00:00Z',
    endsAt: '2026-11-01T17:00:00Z',
    hours: 25,
    after: ['1 am', '1 am again', '2 am'],
  },
  {
    name: 'forward',
    startsAt: '2027-03-13T17:00:00Z',
    endsAt: '2027-03-14T16:00:00Z',
    hours: 23,
    after: ['1 am', '3 am', '4 am'],
  },
])('the night on which clocks go $name', ({ startsAt, endsAt, hours: count, after }) => {
  const from = Date.parse(startsAt)
  const hours = Array.from({ length: count }, (_, index) =>
    hourAt(index % 24, { time: new Date(from + index * HOUR_MILLIS).toISOString() }),
  )
  const night = { date: startsAt.slice(0, 10), startsAt, endsAt, sunsetAt: null, sunriseAt: null }
  const markup = draw({ night, outlook: outlookOf({ hours, passes: [] }) }, from)
  const names = rowsOf(markup)
    .slice(1)
    .map(([name]) => name)

  test('has one row for each of its hours, from noon to 11 am', () => {
    expect(names).toHaveLength(count)
    expect([names[0], names.at(-1)]).toEqual(['noon', '11 am'])
    expect(names.slice(names.indexOf('1 am'), names.indexOf('1 am') + 3)).toEqual(after)
  })

  test('draws one bar for each of its hours, side by side', () => {
    const [, wide = ''] = markup.split('<svg')
    const bars = [...wide.matchAll(/<(?:rect|path) [^>]*class="(?:fill-lamp stroke-lamp-text|stroke-still)"/g)]
    expect(bars).toHaveLength(count)
    const lefts = bars.flatMap(([bar]) => /(?: x="| d="M)([\d.]+)/.exec(bar)?.[1] ?? []).map(Number)
    expect(new Set(lefts).size).toBe(count)
    expect([...lefts].sort((a, b) => a - b)).toEqual(lefts)
  })
})

describe('the night strip', () => {
  test('has a title, a summary and one row in the table for each hour', () => {
    const markup = draw()
    expect(markup).toContain('How fast water freezes, hour by hour')
    expect(markup).toContain('Hours to flood: 7 pm to 2 am.')
    expect(markup).toContain('From 5 am to 9 am snow 2.9 cm.')
    const rows = rowsOf(markup)
    expect(rows).toHaveLength(25)
    expect(rows[1]?.slice(0, 5)).toEqual(['noon', 'hold off', '−1.2', 'not set', '−2'])
    expect(rows[12]).toEqual(['11 pm', 'flood', '2.3', '12:20 am', '−10', 'nothing'])
  })

  test('carries no style attribute and no inline script handler', () => {
    expect(draw()).not.toMatch(/ style=| on[a-z]+="/)
  })

  test('draws 24 hours wide and the 18 hours from 3 pm to 9 am narrow', () => {
    const [wide = '', narrow = ''] = draw()
      .split('<svg')
      .filter((part) => part.includes('strip-'))
      .slice(0, 2)
    expect(wide.match(/noon|midnight|\d [ap]m/g)).not.toBeNull()
    expect(narrow).toContain('>3 pm<')
    expect(narrow).not.toContain('>noon<')
  })

  test('tells verdicts apart without colour: solid, barred, outlined', () => {
    const hours = [hourAt(6, { verdict: 'fill' }), hourAt(7), hourAt(15)]
    const markup = draw({ outlook: outlookOf({ hours }) })
    expect(markup).toContain('fill="url(#strip-wide-barred)"')
    expect(markup).toContain('class="fill-lamp stroke-lamp-text"')
    expect(markup).toContain('>fill<')
  })

  test('names of passes that are still wet when the next begins do not lie over each other', () => {
    // From 8 pm, 9 pm and 10 pm, each wet until 4 am: an hour of the wide strip is (800 - 38 - 44) / 24 = 29.9 px.
    const passes = [passAt(1, 8, 16), passAt(2, 9, 16), passAt(3, 10, 16)]
    const [wide = ''] = draw({ outlook: outlookOf({ passes }) }).split('</svg>')
    const names = [...wide.matchAll(/<text x="([\d.]+)"[^>]*>(Pass \d|\d)<\/text>/g)].filter(
      ([tag]) => tag.includes('font-weight') && tag.includes('fill-ink'),
    )
    expect(names.map(([, , name]) => name)).toEqual(['1', '2', 'Pass 3'])
    expect(Number(names[1]?.[1]) - Number(names[0]?.[1])).toBeCloseTo(29.9, 0)
  })

  test('hours to come without a forecast are hatched and named', () => {
    const hours = Array.from({ length: 14 }, (_, index) => hourAt(index))
    const markup = draw({ outlook: outlookOf({ hours }) })
    expect(markup).toContain('url(#strip-wide-hatch)')
    expect(markup).toContain('>no forecast<')
    expect(markup).toContain('No forecast for 10 of 24 hours.')
  })

  test('speaks Fahrenheit, inches and the 24-hour clock to those who read them', () => {
    const view = tonightView()
    const markup = draw({ viewer: { ...view.viewer, units: IMPERIAL, clock: '24' } })
    const [, , , , , , , , , , , , eleven] = rowsOf(markup)
    expect(eleven?.slice(0, 5)).toEqual(['23:00', 'flood', '0.09', '00:20', '15'])
    expect(markup).toContain('air, °F')
  })

  test('a thaw night with rain still has its frame and says that no hour is good', () => {
    const thaw = Array.from({ length: 24 }, (_, index) => {
      const base = hourAt(index)
      const weather = {
        ...base.weather,
        airTemperatureC: 5,
        precipitationMm: 1,
        rainMm: 1,
        snowfallCm: 0,
      } as typeof base.weather
      return { ...base, freezeRateMmPerH: -2, verdict: 'hold' as const, setsAt: null, weather }
    })
    const markup = draw({ outlook: outlookOf({ hours: thaw, passes: [] }) })
    expect(markup).toContain('No hour is good for flooding or filling.')
    expect(markup).toContain('rain 24.0 mm')
  })

  test('now is drawn while the night lasts and not after it', () => {
    expect(draw()).toContain('now 6:42 pm')
    expect(draw({}, Date.parse(isoAt(25)))).not.toContain('stroke-rust')
  })
})
