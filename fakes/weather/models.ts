// The models and ensembles that can be asked for, and how one run differs from another.
import type { Weather } from './generate'
import { noise } from './noise'

/** By every name under which it may be asked for; answers carry the name given here. */
export const ENSEMBLES: Record<string, { name: string; members: number }> = {
  ncep_gefs025: { name: 'ncep_gefs025', members: 31 },
  gfs025: { name: 'ncep_gefs025', members: 31 },
  gem_global_ensemble: { name: 'gem_global_ensemble', members: 21 },
  gem_global: { name: 'gem_global_ensemble', members: 21 },
  ecmwf_ifs025_ensemble: { name: 'ecmwf_ifs025_ensemble', members: 51 },
  ecmwf_ifs025: { name: 'ecmwf_ifs025_ensemble', members: 51 },
}

export const MODELS = new Set(['best_match', 'gfs_seamless', 'gfs_hrrr', 'gem_seamless', 'icon_seamless'])

/** Runs drift apart with the hours ahead: a tenth of a degree now, some three after ten days. Run 0 is the control. */
export function asRun(weather: Weather, run: number, hoursAhead: number): Weather {
  if (run === 0) return weather
  const spread = 0.1 + Math.max(0, hoursAhead) / 80
  const lean = (salt: number) => noise(run, salt) + 0.6 * Math.sin(hoursAhead / 9 + run * 1.7 + salt)
  const windMps = Math.max(0.2, weather.windMps * (1 + 0.12 * spread * lean(2)))
  const wetness = Math.max(0, 1 + 0.35 * spread * lean(4))
  return {
    ...weather,
    temperatureC: weather.temperatureC + spread * lean(1),
    windMps,
    gustMps: weather.gustMps * (windMps / weather.windMps),
    cloud: Math.min(1, Math.max(0, weather.cloud + 0.12 * spread * lean(3))),
    rainMm: weather.rainMm * wetness,
    snowCm: weather.snowCm * wetness,
  }
}
