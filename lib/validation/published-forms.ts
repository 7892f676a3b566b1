// Published formulas the model does not use, kept to be held beside it in `npm run validate`.
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
