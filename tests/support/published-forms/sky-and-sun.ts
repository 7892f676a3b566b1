// Published forms of sky and sun that the model does not use, kept to be held beside it.

/** All-sky emissivity, Crawford & Duchon 1999; month 1-12, northern. */
export function crawfordDuchonEmissivity(kelvin: number, hpa: number, month: number, cloud: number): number {
  const season = 1.22 + 0.06 * Math.sin(((month + 2) * Math.PI) / 6)
  return cloud + (1 - cloud) * season * Math.pow(hpa / kelvin, 1 / 7)
}

/** Net outgoing longwave of a day, FAO-56 eq. 39. [MJ m⁻² d⁻¹] Temperatures in °C, vapour pressure in kPa, radiation in MJ. */
export function faoNetLongwaveMj(day: {
  maxC: number
  minC: number
  vapourKpa: number
  sun: number
  clearSun: number
}): number {
  const emission = (4.903e-9 * ((day.maxC + 273.16) ** 4 + (day.minC + 273.16) ** 4)) / 2
  return emission * (0.34 - 0.14 * Math.sqrt(day.vapourKpa)) * (1.35 * (day.sun / day.clearSun) - 0.35)
}

/** Sunshine of a day above the atmosphere, FAO-56 eq. 21. [MJ m⁻² d⁻¹] Latitude in degrees, day of the year. */
export function extraterrestrialMj(latitudeDeg: number, dayOfYear: number): number {
  const latitude = (latitudeDeg * Math.PI) / 180
  const declination = 0.409 * Math.sin((2 * Math.PI * dayOfYear) / 365 - 1.39)
  const distance = 1 + 0.033 * Math.cos((2 * Math.PI * dayOfYear) / 365)
  const sunset = Math.acos(Math.min(1, Math.max(-1, -Math.tan(latitude) * Math.tan(declination))))
  const sines = sunset * Math.sin(latitude) * Math.sin(declination)
  return (
    ((24 * 60) / Math.PI) * 0.082 * distance * (sines + Math.cos(latitude) * Math.cos(declination) * Math.sin(sunset))
  )
}

/**
 * Julian date of an instant, the day count that sun positions are reckoned by.
 *
 * @param atMillis Instant. [ms since 1970-01-01 UTC]
 * @returns Days. [d]
 *
 * Source: definition; the Unix epoch is 2440587.5.
 */
export function julianDate(atMillis: number): number {
  return atMillis / 86_400_000 + 2_440_587.5
}
