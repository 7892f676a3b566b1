// Radiation, exchange and latent heat against published values. The source stands beside each value.
import { describe, expect, test } from 'vitest'
import { albedo } from '@/lib/physics/albedo'
import { precipitationHeatWm2, surfaceBalance } from '@/lib/physics/balance'
import {
  FUSION_J_PER_KG,
  HOUR_SECONDS,
  ICE_DENSITY,
  SURFACE_EMISSIVITY,
  VAPORISATION_J_PER_KG,
} from '@/lib/physics/constants'
import { cylinderNusselt } from '@/lib/physics/convection'
import { psychrometricHpaPerK, saturationOverWaterHpa } from '@/lib/physics/humidity'
import { blackBodyWm2, clearSkyEmissivity, cloudySkyEmissivity } from '@/lib/physics/sky'
import { CLEAR_SKY_EMISSIVITIES } from '@/lib/validation/published-forms'
import { frozenByColdMm, indoorRinkTransfer, plateNusselt, warmFaceUpNusselt } from '../support/published-forms/heat'
import { crawfordDuchonEmissivity, faoNetLongwaveMj } from '../support/published-forms/sky-and-sun'
import { steadyHour } from '@/lib/validation/steady-hours'

describe('longwave', () => {
  // Prata 1996, Q. J. R. Meteorol. Soc. 122, 1127, at 263.15 K and 2.0 hPa; coefficients seen in code, value computed from them.
  test('clear-sky emissivity of the model', () => {
    expect(Math.abs(clearSkyEmissivity(-10, 2.0) - 0.699)).toBeLessThan(0.002)
  })
  // Forms held beside it, at 263.15 K and 2.0 hPa unless said otherwise; computed from published coefficients.
  test.each([
    { form: 'brutsaert', kelvin: 263.15, value: 0.6176, tolerance: 0.002 },
    { form: 'satterlund', kelvin: 263.15, value: 0.7186, tolerance: 0.002 },
    { form: 'andreasAckley', kelvin: 263.15, value: 0.6366, tolerance: 0.002 },
    { form: 'konzelmann', kelvin: 263.15, value: 0.6977, tolerance: 0.002 },
    { form: 'dilleyObrien', kelvin: 263.15, value: 0.6867, tolerance: 0.002 },
    { form: 'swinbank', kelvin: 273.15, value: 0.6987, tolerance: 0.001 },
    // Idso & Jackson 1969, J. Geophys. Res. 74, 5397: its minimum, and the wrong rise in the cold.
    { form: 'idsoJackson', kelvin: 273.15, value: 0.739, tolerance: 0.0005 },
    { form: 'idsoJackson', kelvin: 253.15, value: 0.8087, tolerance: 0.001 },
  ])('$form at $kelvin K is $value', ({ form, kelvin, value, tolerance }) => {
    expect(Math.abs(CLEAR_SKY_EMISSIVITIES[form]!(kelvin, 2.0) - value)).toBeLessThanOrEqual(tolerance)
  })
  // Crawford & Duchon 1999, J. Appl. Meteorol. 38, 474: January, half cloud.
  test('all-sky emissivity after Crawford and Duchon', () => {
    expect(Math.abs(crawfordDuchonEmissivity(263.15, 2.0, 1, 0.5) - 0.8187)).toBeLessThan(0.002)
  })
  // Allen et al. 1998, FAO-56 Example 11.
  test('net longwave of a day after FAO-56', () => {
    const mj = faoNetLongwaveMj({ maxC: 25.1, minC: 19.1, vapourKpa: 2.1, sun: 14.5, clearSun: 18.8 })
    expect(Math.abs(mj - 3.5)).toBeLessThan(0.06)
  })
  test('a black surface at 0 °C emits 315.7 W/m²', () => {
    expect(Math.abs(blackBodyWm2(0) - 315.7)).toBeLessThan(0.2)
  })
  // Prata 1996 and Stefan-Boltzmann: -10 °C, 80 % over water, clear, emissivity 0.97. The source counts the loss negative.
  test('a wet surface under a clear sky at -10 °C loses 120.8 W/m² by radiation', () => {
    const hour = steadyHour({ airTemperatureC: -10, relativeHumidity: 0.8, cloudCover: 0, windSpeedMps: 0 })
    expect(Math.abs(surfaceBalance(hour, 'wet', 0).parts.longwave - 120.8)).toBeLessThan(3)
  })
})

describe('the whole loss with an indoor coefficient', () => {
  // ASHRAE's indoor line (from memory), Lewis analogy, Prata, Unsworth & Monteith; totals computed from those. W/m².
  test.each([
    { airC: -10, humidity: 0.8, windMps: 0, cloud: 0, totalWm2: 174.7 },
    { airC: -10, humidity: 0.8, windMps: 2, cloud: 0, totalWm2: 287.1 },
    { airC: -10, humidity: 0.8, windMps: 2, cloud: 1, totalWm2: 221.3 },
    { airC: -5, humidity: 0.8, windMps: 2, cloud: 0, totalWm2: 199.0 },
    { airC: -5, humidity: 0.8, windMps: 2, cloud: 1, totalWm2: 131.2 },
    { airC: -20, humidity: 0.8, windMps: 2, cloud: 0, totalWm2: 443.6 },
    { airC: 1, humidity: 0.5, windMps: 1, cloud: 0, totalWm2: 107.5 },
  ])('at $airC °C, $windMps m/s, cloud $cloud is $totalWm2', ({ airC, humidity, windMps, cloud, totalWm2 }) => {
    const vapour = humidity * saturationOverWaterHpa(airC)
    const sky = cloudySkyEmissivity(clearSkyEmissivity(airC, vapour), cloud) * blackBodyWm2(airC)
    const transfer = indoorRinkTransfer(windMps)
    const longwave = SURFACE_EMISSIVITY * (blackBodyWm2(0) - sky)
    const latent = (transfer * (saturationOverWaterHpa(0) - vapour)) / psychrometricHpaPerK(1013.25)
    expect(Math.abs(longwave - transfer * airC + latent - totalWm2)).toBeLessThan(3)
  })
  // ASHRAE Handbook - Refrigeration, Ice Rinks, 3.41 + 3.55 V; from memory.
  test.each([
    [0, 3.41],
    [2, 10.51],
    [5, 21.16],
  ])('the indoor line at %d m/s is %d W/m²K', (windMps, transfer) => {
    expect(Math.abs(indoorRinkTransfer(windMps) - transfer)).toBeLessThan(0.01)
  })
})

describe('convection', () => {
  // Churchill & Ozoe 1973, J. Heat Transfer 95, 416.
  test('laminar plate', () => expect(Math.abs(plateNusselt(1e5, 0.7) - 183.086)).toBeLessThan(0.05))
  // McAdams, 0.15 Ra^(1/3).
  test('warm face up', () => expect(Math.abs(warmFaceUpNusselt(3.21e8, 5.54) - 181.731)).toBeLessThan(0.1))
  // Churchill & Bernstein; Incropera & DeWitt Example 7.4 prints about 40.6.
  test('cylinder across the wind', () => expect(Math.abs(cylinderNusselt(6071, 0.7) - 40.637)).toBeLessThan(0.05))
})

describe('latent heat', () => {
  // FAO-56 Example 2, p. 63; FAO takes 2.45 MJ/kg.
  test('psychrometric constant at 81.8 kPa', () => {
    expect(Math.abs(psychrometricHpaPerK(818, 2.45e6) / 10 - 0.054)).toBeLessThan(0.0005)
  })
  // cp p / (0.622 Lv) at 1013.25 hPa (Chilton-Colburn with Lewis factor 1).
  test('psychrometric coefficient at sea level', () => {
    expect(Math.abs(psychrometricHpaPerK(1013.25) - 0.6546)).toBeLessThan(0.001)
  })
  // Snyder & de Melo-Abreu 2005, FAO Frost Protection, vol. 1, ch. 3.
  test('evaporating 1 mm freezes 7.5 mm', () => {
    expect(Math.abs(VAPORISATION_J_PER_KG / FUSION_J_PER_KG - 7.5)).toBeLessThan(0.03)
  })
})

describe('albedo', () => {
  // General Lake Model, ice: 0.44 - 0.032 T from -5 to 0 °C.
  test.each([
    [-5, 0.6],
    [-2.5, 0.52],
  ])('bare ice at %d °C is %d', (surfaceC, value) => {
    expect(Math.abs(albedo('ice', surfaceC) - value)).toBeLessThan(0.001)
  })
  // Mironov 2005, FLake reference value.
  test('open water is 0.07', () => expect(albedo('water', 1)).toBe(0.07))
  // Avalanche glossary: fresh up to 0.9, melting 0.4, dirty 0.2.
  test('snow lies between dirty and fresh', () => {
    expect(albedo('snow', -5)).toBeLessThan(0.9)
    expect(albedo('snow', 0)).toBeGreaterThanOrEqual(0.4)
  })
})

describe('rain and cold', () => {
  // ρ c P T / 3600: 10 mm/h at 5 °C.
  test('rain of 10 mm/h at 5 °C brings 58.1 W/m²', () => {
    const hour = steadyHour({ airTemperatureC: 5, precipitationMm: 10, rainMm: 10 })
    expect(Math.abs(-precipitationHeatWm2(hour) - 58.1)).toBeLessThan(0.3)
  })
  // USACE, 0.0125 P T; from memory.
  test('it melts 0.625 mm', () => {
    const hour = steadyHour({ airTemperatureC: 5, precipitationMm: 10, rainMm: 10 })
    const meltMm = (-precipitationHeatWm2(hour) * HOUR_SECONDS) / FUSION_J_PER_KG
    expect(Math.abs(meltMm - 0.625)).toBeLessThan(0.005)
  })
  // 0.1 m × 917 × 2100 × 5 / 334000.
  test('100 mm of ice with a mean of -5 °C freezes 2.88 mm of water', () => {
    expect(Math.abs(frozenByColdMm(0.1, -5, ICE_DENSITY) - 2.88)).toBeLessThan(0.03)
  })
})
