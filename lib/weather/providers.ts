// Picks the weather service. A new one is a file that implements WeatherProvider, a line here and its name in lib/env.ts.
import type { Environment } from '@/lib/env'
import { createOpenMeteo } from './open-meteo'
import type { WeatherProvider } from './port'

const PROVIDERS: Record<Environment['WEATHER_PROVIDER'], (env: Environment) => WeatherProvider> = {
  'open-meteo': (env) =>
    createOpenMeteo({
      baseUrl: env.OPEN_METEO_URL,
      apiKey: env.OPEN_METEO_API_KEY,
      ensembleUrl: env.OPEN_METEO_ENSEMBLE_URL,
      userAgent: `Nightsheet (${env.PUBLIC_URL})`,
    }),
}

/** The provider that the settings name. */
export function createProvider(env: Environment): WeatherProvider {
  return PROVIDERS[env.WEATHER_PROVIDER](env)
}
