// The shapes that physics works on. SI units and °C inside; the unit is the end of the name.

/**
 * One hour of weather, whichever service it came from. It covers the hour that starts at `time`.
 * Temperatures, wind, cloud and pressure are the value at (or mean over) that hour; precipitation,
 * snowfall and radiation are the sum or mean of that hour. Missing is null, never 0.
 */
export interface HourlyRecord {
  /** Start of the hour, UTC, ISO 8601 ("2027-01-12T17:00:00Z"). */
  time: string
  airTemperatureC: number | null
  dewPointC: number | null
  /** At 10 m. [m/s] */
  windSpeedMps: number | null
  windGustMps: number | null
  /** 0-1 */
  cloudCover: number | null
  /** Global horizontal. [W/m²] */
  shortwaveWm2: number | null
  /** All phases, water equivalent. [mm in the hour] */
  precipitationMm: number | null
  /** Liquid part. [mm in the hour] */
  rainMm: number | null
  /** Depth of new snow. [cm in the hour] */
  snowfallCm: number | null
  /** At the surface. [hPa] */
  pressureHpa: number | null
  /** Measured or forecast; used instead of the sky formulas when present. [W/m²] */
  longwaveDownWm2?: number | null
  /** Measured snow lying on the sheet; used instead of the modelled cover when present. [cm] */
  snowOnIceCm?: number | null
}

/** What the yard does to the weather. */
export interface Site {
  latitudeDeg: number
  longitudeDeg: number
  /** Factor on the wind at rink height, 0 (no wind reaches it) to 1 (open field). */
  shelter: number
  /** Share of the sky dome that is open, 0-1; the rest radiates at air temperature. */
  skyView: number
  /** Height of the skyline: one all round, or eight from north clockwise. [°] None when absent. */
  horizonDeg?: number | readonly number[]
  /** Share of direct sunshine that trees or a cloth keep off, 0-1. None when absent. */
  shade?: number
}

/** What a wet surface at 0 °C loses, positive when heat leaves it. [W/m²] */
export interface HeatBalanceParts {
  longwave: number
  sensible: number
  latent: number
  /** Absorbed sunshine, positive when it warms the surface: net = longwave + sensible + latent - shortwave + precipitation. */
  shortwave: number
  precipitation: number
}

/** What the rink lies on. */
export type Base = 'liner' | 'ground' | 'snow'

/** How much wind reaches the yard. */
export type ShelterName = 'open' | 'suburban' | 'tight'

/**
 * An hour of weather with every gap closed, at one rink. Made by prepareHours. Where `isKnown` is false the numbers are
 * placeholders and must not be used.
 */
export interface PreparedHour {
  /** [ms since 1970-01-01 UTC] */
  startsAtMillis: number
  /** As in the record. */
  time: string
  isKnown: boolean
  airTemperatureC: number
  vapourPressureHpa: number
  /** At rink height, behind the yard's shelter. [m/s] */
  windAtRinkMps: number
  /** At 10 m. [m/s] */
  windSpeedMps: number
  windGustMps: number
  /** [0-1] */
  cloudCover: number
  shortwaveWm2: number
  /** From the open sky and from what stands around. */
  longwaveDownWm2: number
  /** All phases, water equivalent. [mm in the hour] */
  precipitationMm: number
  rainMm: number
  snowfallCm: number
  pressureHpa: number
  /** Measured snow on the sheet, or null. [cm] */
  snowOnIceCm: number | null
}
