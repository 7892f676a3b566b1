// Constants against releases and handbooks. The source stands beside each value.
import { expect, test } from 'vitest'
import * as constants from '@/lib/physics/constants'

test.each([
  // IAPWS R10-06(2009), Ice Ih, Table 6, at 273.152519 K and 101325 Pa.
  { what: 'ICE_DENSITY', published: 916.721463, tolerance: 0.001 },
  { what: 'ICE_HEAT_CAPACITY', published: 2096.714, tolerance: 0.01 },
  // CRC Handbook, enthalpy of fusion at 0 °C. IAPWS gives 333.43e3.
  { what: 'FUSION_J_PER_KG', published: 333_600, tolerance: 300 },
  // CRC prints 2838e3 ± 3e3; vaporisation 2501e3 and fusion make 2834.6e3, which is also the meteorological value.
  { what: 'SUBLIMATION_J_PER_KG', published: 2_838_000, tolerance: 4000 },
  // IAPWS SR6-08(2011): 4181 at 25 °C, 4218 at 0 °C; the model needs the middle of that.
  { what: 'WATER_HEAT_CAPACITY', published: 4199, tolerance: 19 },
  // Ashton, Encyclopaedia Britannica 2.24; CRC prints 2.14, FAO 2.22 at 0 °C, others up to 2.31.
  { what: 'ICE_CONDUCTIVITY', published: 2.24, tolerance: 0.02 },
] as const)('$what is $published within $tolerance', ({ what, published, tolerance }) => {
  expect(Math.abs(constants[what] - published)).toBeLessThanOrEqual(tolerance)
})
