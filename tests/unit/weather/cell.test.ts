// Which rinks share a forecast.
import { expect, test } from 'vitest'
import { cellOf } from '@/lib/weather/cell'

test('rinks of one street share a cell, rinks of two villages do not', () => {
  expect(cellOf(45.4213, -75.6912)).toEqual({ latitudeDeg: 45.42, longitudeDeg: -75.69 })
  expect(cellOf(45.4239, -75.6888)).toEqual(cellOf(45.4213, -75.6912))
  expect(cellOf(45.4613, -75.6912)).not.toEqual(cellOf(45.4213, -75.6912))
})

test('there is one zero and one date line', () => {
  expect(cellOf(-0.001, 0.002)).toEqual({ latitudeDeg: 0, longitudeDeg: 0 })
  expect(cellOf(60, 179.999)).toEqual(cellOf(60, -180))
})

test.each([
  [90.1, 0],
  [0, -180.1],
  [NaN, 0],
  [0, Infinity],
])('%s, %s is off the globe', (latitudeDeg, longitudeDeg) => {
  expect(() => cellOf(latitudeDeg, longitudeDeg)).toThrow(RangeError)
})
