// Finding places without a network. Positions and regions as any atlas gives them.
import { describe, expect, test } from 'vitest'
import { foldName } from '@/lib/places/fold'
import { findNearestPlace, findPlaces } from '@/lib/places/gazetteer'
import { timeZoneAt } from '@/lib/places/time-zone'

describe('by name', () => {
  test('the biggest place of a name comes first, with region and country to tell it from the others', async () => {
    const [first, ...others] = await findPlaces('ottawa')
    expect(first).toMatchObject({ name: 'Ottawa', region: 'Ontario', country: 'Canada' })
    expect(first?.latitudeDeg).toBeCloseTo(45.42, 1)
    expect(first?.longitudeDeg).toBeCloseTo(-75.69, 1)
    expect(others.map(({ region }) => region)).toContain('IL')
  })

  test.each([
    ['montreal', 'Montréal'],
    ['TROIS-RIV', 'Trois-Rivières'],
    ['tromso', 'Tromsø'],
    ['lodz', 'Łódź'],
    ["st. john's", "St. John's"],
    ['sudb', 'Greater Sudbury'],
  ])('%s finds %s', async (query, name) => {
    expect((await findPlaces(query))[0]?.name).toBe(name)
  })

  test('a comma narrows it down to a region or a country', async () => {
    expect((await findPlaces('ottawa, il'))[0]).toMatchObject({ region: 'IL', country: 'United States' })
    expect((await findPlaces('london, canada'))[0]).toMatchObject({ region: 'Ontario' })
  })

  test('one letter, nothing and nonsense find nothing', async () => {
    for (const query of ['o', '', '   ', ',', 'zzzzqqq', '%', '.*']) expect(await findPlaces(query)).toEqual([])
  })

  test('no more than asked for', async () => {
    expect(await findPlaces('san', 3)).toHaveLength(3)
  })
})

describe('by position', () => {
  test('the nearest town names the place', async () => {
    expect(await findNearestPlace(45.9, -77.28)).toMatchObject({ name: 'Petawawa', region: 'Ontario' })
  })

  test('the date line is no wall', async () => {
    // Labasa, Fiji, lies west of the line, at 16.4 S 179.4 E.
    expect(await findNearestPlace(-16.8, -179.95)).toMatchObject({ country: 'Fiji' })
  })

  test('in the middle of an ocean there is none', async () => {
    expect(await findNearestPlace(-48, -123)).toBeUndefined()
  })
})

describe('zones', () => {
  // Atikokan, Blanc-Sablon and Creston keep their own time all year; a merged table would name other countries' zones.
  test.each([
    [45.9, -77.3, 'America/Toronto'],
    [48.75, -91.62, 'America/Atikokan'],
    [51.43, -57.13, 'America/Blanc-Sablon'],
    [61.05, 28.19, 'Europe/Helsinki'],
    [64.84, -147.72, 'America/Anchorage'],
  ])('%d, %d lies in %s', (latitude, longitude, zone) => {
    expect(timeZoneAt(latitude, longitude)).toBe(zone)
  })

  test('poles and the date line have a zone too', () => {
    for (const [latitude, longitude] of [
      [90, 0],
      [-90, 180],
      [0, -180],
    ] as const) {
      expect(() => new Intl.DateTimeFormat('en', { timeZone: timeZoneAt(latitude, longitude) })).not.toThrow()
    }
  })
})

test.each([
  ['  Sault-Sainte–Marie ', 'sault sainte marie'],
  ['Þórshöfn', 'thorshofn'],
  ['Straße', 'strasse'],
])('%s folds to %s', (name, folded) => {
  expect(foldName(name)).toBe(folded)
})
