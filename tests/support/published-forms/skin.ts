// Published forms of wind chill and frostbite that the product does not use, kept to be held beside its own.

const KMH_PER_MPS = 3.6

/** Wind chill of the US National Weather Service, 2001. [°F] Air in °F, wind in mph. The model uses the same index in SI. */
export function usWindChillF(airF: number, windMph: number): number {
  const power = Math.pow(windMph, 0.16)
  return 35.74 + 0.6215 * airF - 35.75 * power + 0.4275 * airF * power
}

/**
 * Minutes to frostbite in strong wind.
 *
 * @param airTemperatureC Air. [°C], below -4.8
 * @param windSpeedMps Wind at 10 m. [m/s], 25 to 80 km/h
 * @returns Minutes, or null where the equation does not hold (outside the wind range, or over 30 minutes).
 *
 * Source: equation in the United States' forecast software: [-24.5 (0.667 V + 4.8) + 2111] (-4.8 - T)^-1.668, V in km/h.
 */
export function frostbiteMinutes(airTemperatureC: number, windSpeedMps: number): number | null {
  const windKmh = windSpeedMps * KMH_PER_MPS
  if (!(windKmh > 25 && windKmh <= 80 && airTemperatureC < -4.8)) return null
  const minutes = (-24.5 * (0.667 * windKmh + 4.8) + 2111) * Math.pow(-4.8 - airTemperatureC, -1.668)
  return minutes <= 30 ? minutes : null
}
