// Published formulas the model does not use, kept to be held beside it in `npm run validate` and in the published tests.
const SIGMA = 5.670374e-8

/** Clear-sky emissivities by author. T in K, e in hPa. Sources as listed in each line. */
export const CLEAR_SKY_EMISSIVITIES: Record<string, (kelvin: number, hpa: number) => number> = {
  // Brutsaert 1975.
  brutsaert: (kelvin, hpa) => 1.24 * Math.pow(hpa / kelvin, 1 / 7),
  // Satterlund 1979.
  satterlund: (kelvin, hpa) => 1.08 * (1 - Math.exp(-Math.pow(hpa, kelvin / 2016))),
  // Andreas & Ackley 1982, polar.
  andreasAckley: (kelvin, hpa) => 0.601 + 5.95e-5 * hpa * Math.exp(1500 / kelvin),
  // Konzelmann et al. 1994, ice sheet; e in Pa.
  konzelmann: (kelvin, hpa) => 0.23 + 0.484 * Math.pow((hpa * 100) / kelvin, 1 / 8),
  // Dilley & O'Brien 1998: a flux over that of a black body.
  dilleyObrien: (kelvin, hpa) => {
    const water = (46.5 * hpa) / kelvin
    const flux = 59.38 + 113.7 * Math.pow(kelvin / 273.16, 6) + 96.96 * Math.sqrt(water / 2.5)
    return flux / (SIGMA * kelvin ** 4)
  },
  // Swinbank 1963.
  swinbank: (kelvin) => 9.365e-6 * kelvin * kelvin,
  // Idso & Jackson 1969: symmetric about 0 °C, so it rises as air cools. A trap.
  idsoJackson: (kelvin) => 1 - 0.261 * Math.exp(-7.77e-4 * (273.15 - kelvin) ** 2),
}

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

/** Convection over an indoor rink, ASHRAE Refrigeration, Ice Rinks: 3.41 + 3.55 V. [W m⁻² K⁻¹] From memory. */
export function indoorRinkTransfer(windMps: number): number {
  return 3.41 + 3.55 * windMps
}

/** Sublimation pressure of ice, IAPWS R14-08. [Pa] T in K, 50 to 273.16. */
export function iapwsSublimationPa(kelvin: number): number {
  const theta = kelvin / 273.16
  const sum = -21.2144006 * theta ** 0.00333333333 + 27.3203819 * theta ** 1.20666667 - 6.1059813 * theta ** 1.70333333
  return 611.657 * Math.exp(sum / theta)
}

/** Saturation pressure of water, IAPWS-95 auxiliary equation (Wagner & Pruss 2002). [Pa] T in K. */
export function iapwsSaturationPa(kelvin: number): number {
  const tau = 1 - kelvin / 647.096
  const sum =
    -7.85951783 * tau +
    1.84408259 * tau ** 1.5 -
    11.7866497 * tau ** 3 +
    22.6807411 * tau ** 3.5 -
    15.9618719 * tau ** 4 +
    1.80122502 * tau ** 7.5
  return 22.064e6 * Math.exp((647.096 / kelvin) * sum)
}

/** Wind chill of the US National Weather Service, 2001. [°F] Air in °F, wind in mph. The model uses the same index in SI. */
export function usWindChillF(airF: number, windMph: number): number {
  const power = Math.pow(windMph, 0.16)
  return 35.74 + 0.6215 * airF - 35.75 * power + 0.4275 * airF * power
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
