// Windows and thaws found in rows of hours written by hand.
import { describe, expect, test } from 'vitest'
import { findThaws, type ThawHour } from '@/lib/advice/thaw'
import { findWindows } from '@/lib/advice/windows'
import type { Verdict } from '@/lib/advice/types'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import { FIRST_MILLIS, timeOf } from '../../support/advice-weather'

describe('windows', () => {
  const verdicts: Record<string, Verdict> = { f: 'flood', i: 'fill', h: 'hold' }
  /** Capitals are hours in which nobody can go out. */
  const hoursOf = (row: string) =>
    [...row].map((letter) => ({
      verdict: verdicts[letter.toLowerCase()] ?? 'hold',
      isOpen: letter === letter.toLowerCase(),
    }))

  test.each([
    ['hhffh', [['flood', 2, 4]]],
    [
      'ffhiih',
      [
        ['flood', 0, 2],
        ['fill', 3, 5],
      ],
    ],
    [
      'fFf',
      [
        ['flood', 0, 1],
        ['flood', 2, 3],
      ],
    ],
    ['FFF', []],
    [
      'fi',
      [
        ['flood', 0, 1],
        ['fill', 1, 2],
      ],
    ],
    ['', []],
  ])('of %s are %j', (row, expected) => {
    expect(findWindows(hoursOf(row)).map(({ kind, from, to }) => [kind, from, to])).toEqual(expected)
  })
})

describe('thaws', () => {
  /** 10 mm at first; each entry is the loss of an hour, 'good' a good hour. */
  function hoursOf(row: (number | 'good')[]): ThawHour[] {
    let thicknessMm = 100
    return row.map((one, index) => {
      thicknessMm -= one === 'good' ? 0 : one
      return { startMillis: FIRST_MILLIS + index * HOUR_MILLIS, isGood: one === 'good', isKnown: true, thicknessMm }
    })
  }
  const repeat = (count: number, loss: number) => Array.from({ length: count }, () => loss)

  test('a day of melting is a thaw, from its first loss to its last', () => {
    const thaws = findThaws(hoursOf(['good', ...repeat(5, 0), ...repeat(24, 0.5), ...repeat(3, 0), 'good']), 100)
    expect(thaws).toEqual([{ startsAt: timeOf(6), endsAt: timeOf(30), lossMm: 12 }])
  })

  test('twenty-three hours are not', () => {
    expect(findThaws(hoursOf(['good', ...repeat(23, 0.5), 'good']), 100)).toEqual([])
  })

  test('a day of snow without loss is not', () => {
    expect(findThaws(hoursOf(repeat(40, 0.01)), 100)).toEqual([])
  })

  test('a good hour between parts it in two, of which the short one is dropped', () => {
    const thaws = findThaws(hoursOf([...repeat(30, 0.2), 'good', ...repeat(10, 0.2)]), 100)
    expect(thaws).toEqual([{ startsAt: timeOf(0), endsAt: timeOf(30), lossMm: 6 }])
  })
})
