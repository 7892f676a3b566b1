// Rows of the collection of published checks (../shared/reference/checks.json) that have no test here, each with its reason.
import { existsSync, readFileSync } from 'node:fs'
import { describe, expect, test } from 'vitest'

const CHECKS = '../shared/reference/checks.json'

const REASONS: Record<string, string> = {
  'ice-09': 'a rough ratio for calm or cloudy nights; the model has the fluxes themselves',
  'con-03': 'the model takes 333.6 kJ/kg (CRC), 0.07 % from the IAPWS value',
  'con-04': 'water at 25 °C; the model works near 0 °C with one heat capacity',
  'con-07': 'one conductivity, 2.24 W/mK (Ashton), for all ice; CRC prints 2.14 at 0 and 2.3 at -10 °C',
  'con-14': 'one density, that of 0 °C; 0.2 % less than at -10 °C',
  'hum-24': 'the wet bulb of Stull is not used: the model takes vapour pressure',
  'hum-28': 'psychrometer coefficients are not used: the model takes dew points',
  'wind-20': 'a windbreak table; shelter is a setting learned from reports',
  'hot-01': 'round coefficients of a resurfacer; the model differs by 0.02 % for its own constants',
  'hyd-05': 'velocity in a pipe is not used',
  'snow-10': 'a step table; the model takes the form of Anderson 1976',
  'snow-13': 'another scheme; the model takes the form of Anderson 1976',
}

describe.skipIf(!existsSync(CHECKS))('rows without a test (needs ../shared/reference/checks.json)', () => {
  test.each(Object.entries(REASONS))('%s: %s', (id) => {
    const rows = JSON.parse(readFileSync(CHECKS, 'utf8')) as { id: string; core: boolean }[]
    expect(rows.find((row) => row.id === id)).toMatchObject({ core: false })
  })
})
