// Nights and wall clocks, above all on the nights when the clocks change.
import { formatInTimeZone } from 'date-fns-tz'
import { describe, expect, test } from 'vitest'
import { nightBounds, nightDateOf, tonightDate, tonightStartsAt } from '@/lib/advice/night'
import { instantOfLocal, toIso, zoneOffsetMinutes, zoneOffsetsMinutes } from '@/lib/advice/zoned-time'
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'

const at = (iso: string) => new Date(iso)

describe('the night an instant lies in', () => {
  // Toronto is UTC-5 in January: noon is 17:00Z.
  test.each([
    ['2027-01-12T16:59:00Z', '2027-01-11'],
    ['2027-01-12T17:00:00Z', '2027-01-12'],
    ['2027-01-13T04:30:00Z', '2027-01-12'],
    ['2027-01-13T16:59:59Z', '2027-01-12'],
  ])('%s lies in the night of %s', (iso, night) => {
    expect(nightDateOf(at(iso), 'America/Toronto')).toBe(night)
  })

  test('before 9 am tonight is the running night, from 9 am the one to come', () => {
    expect(tonightDate(at('2027-01-13T13:59:00Z'), 'America/Toronto')).toBe('2027-01-12')
    expect(tonightDate(at('2027-01-13T14:00:00Z'), 'America/Toronto')).toBe('2027-01-13')
    expect(tonightDate(at('2027-01-13T20:00:00Z'), 'America/Toronto')).toBe('2027-01-13')
  })

  // The clocks in Toronto go forward on 14 March: 9 am is 13:00Z from then on.
  test.each([
    ['2027-01-13', '2027-01-13T14:00:00Z'],
    ['2027-03-14', '2027-03-14T13:00:00Z'],
  ])('the night of %s is tonight from %s on', (night, iso) => {
    expect(tonightStartsAt(night, 'America/Toronto')).toEqual(at(iso))
    expect(tonightDate(at(iso), 'America/Toronto')).toBe(night)
    expect(tonightDate(new Date(at(iso).getTime() - 1), 'America/Toronto')).not.toBe(night)
  })

  test('works east of Greenwich and in a zone of half hours', () => {
    expect(nightDateOf(at('2027-01-12T10:30:00Z'), 'Europe/Helsinki')).toBe('2027-01-12')
    expect(nightDateOf(at('2027-01-12T06:29:00Z'), 'Asia/Kolkata')).toBe('2027-01-11')
    expect(nightDateOf(at('2027-01-12T06:30:00Z'), 'Asia/Kolkata')).toBe('2027-01-12')
  })
})

test('instants are written as the platform writes them, without milliseconds', () => {
  for (const text of [
    '2027-01-12T17:00:00.000Z',
    '2027-12-31T23:59:59.000Z',
    '1969-07-20T20:17:40.000Z',
    '2028-02-29T00:00:00.000Z',
  ]) {
    expect(toIso(Date.parse(text))).toBe(text.replace('.000', ''))
  }
  expect(toIso(Date.parse('2027-01-12T17:00:00.789Z'))).toBe('2027-01-12T17:00:00Z')
})

describe('the length of a night', () => {
  // Clocks in Toronto go forward on 14 March 2027 at 2 am and back on 7 November 2027 at 2 am.
  test.each([
    ['2027-01-12', 24],
    ['2027-03-13', 23],
    ['2027-11-06', 25],
  ])('the night of %s has %i hours', (night, hours) => {
    const { startsAt, endsAt } = nightBounds(night, 'America/Toronto')
    expect((endsAt.getTime() - startsAt.getTime()) / HOUR_MILLIS).toBe(hours)
  })

  test('nights follow each other without gap or overlap through a winter', () => {
    let night = nightBounds('2026-10-01', 'Europe/Berlin')
    for (let day = 0; day < 200; day += 1) {
      const next = nightBounds(nightDateOf(night.endsAt, 'Europe/Berlin'), 'Europe/Berlin')
      expect(next.startsAt).toEqual(night.endsAt)
      night = next
    }
  })
})

describe('an instant from a wall clock', () => {
  const minuteOf = (hour: number, minute = 0) => hour * 60 + minute
  const instant = (date: string, minute: number) =>
    new Date(instantOfLocal(date, minute, 'America/Toronto')).toISOString()

  test('a plain evening', () => {
    expect(instant('2027-01-12', minuteOf(20))).toBe('2027-01-13T01:00:00.000Z')
  })

  test('half past two in the spring gap gives the first instant after it, 3 am daylight time', () => {
    expect(instant('2027-03-14', minuteOf(2, 30))).toBe('2027-03-14T07:00:00.000Z')
    expect(instant('2027-03-14', minuteOf(2))).toBe('2027-03-14T07:00:00.000Z')
    expect(instant('2027-03-14', minuteOf(3))).toBe('2027-03-14T07:00:00.000Z')
    expect(instant('2027-03-14', minuteOf(1, 59))).toBe('2027-03-14T06:59:00.000Z')
  })

  test('an hour that occurs twice gives the first', () => {
    expect(instant('2027-11-07', minuteOf(1, 30))).toBe('2027-11-07T05:30:00.000Z')
    expect(instant('2027-11-07', minuteOf(2))).toBe('2027-11-07T07:00:00.000Z')
  })

  test('offsets agree with an independent library through the hours around both changes', () => {
    for (const start of ['2027-03-14T00:00:00Z', '2027-11-07T00:00:00Z', '2027-03-28T00:00:00Z']) {
      for (let quarter = 0; quarter < 48; quarter += 1) {
        const millis = Date.parse(start) + (quarter * HOUR_MILLIS) / 4
        for (const zone of ['America/Toronto', 'Europe/Berlin', 'UTC', 'Asia/Kathmandu']) {
          const shown = formatInTimeZone(millis, zone, "yyyy-MM-dd'T'HH:mm:ss'Z'")
          expect(millis + zoneOffsetMinutes(millis, zone) * MINUTE_MILLIS).toBe(Date.parse(shown))
        }
      }
    }
  })

  test('offsets of a run of hours across a change are each their own', () => {
    const hours = Array.from({ length: 6 }, (_, hour) => Date.parse('2027-03-14T04:00:00Z') + hour * HOUR_MILLIS)
    expect(zoneOffsetsMinutes(hours, 'America/Toronto')).toEqual([-300, -300, -300, -240, -240, -240])
    expect(zoneOffsetMinutes(Date.parse('2027-01-01T00:00:00Z'), 'America/St_Johns')).toBe(-210)
  })
})
