// What the rest of the product knows of a weather service. One adapter per provider implements WeatherProvider.
import type { HourlyRecord } from '@/lib/physics/types'

/** A place on the provider's grid, as we ask for it: rinks that round to the same cell share one request. */
export interface GridCell {
  /** Rounded by `cellOf`. */
  latitudeDeg: number
  longitudeDeg: number
}

export interface Forecast {
  provider: string
  /** The model run's time, when the provider says it. */
  issuedAt: Date | null
  fetchedAt: Date
  /** After this the forecast is stale: shown with its age, never alerted on. */
  expiresAt: Date
  /** Contiguous and ascending, from about a day in the past to ten days ahead. */
  hours: HourlyRecord[]
  /** Other runs over the same hours, when the provider has them. */
  members: HourlyRecord[][] | null
  attribution: { text: string; url: string; licence: string }
}

export interface WeatherProvider {
  /** Stable id, stored with every forecast. */
  readonly id: string
  /** Fields that can ever be non-null, so that the page can say what the source lacks. */
  readonly fields: ReadonlySet<keyof HourlyRecord>
  /**
   * Hourly forecast for one grid cell.
   * @throws WeatherError with a kind that says whether trying again helps.
   */
  fetchHourly(cell: GridCell, options: { now: Date; signal?: AbortSignal }): Promise<Forecast>
}

export type WeatherErrorKind =
  | 'transient' // network, 5xx, time limit: tried again with backoff inside the adapter, then reported
  | 'throttled' // 429: not tried again before retryAt
  | 'refused' // 400/401/403/404: a setting is wrong, trying again does not help
  | 'malformed' // a 200 that is not a forecast: tried again, never stored
  | 'coverage' // the service has nothing for this place

export class WeatherError extends Error {
  constructor(
    readonly kind: WeatherErrorKind,
    message: string,
    options: { cause?: unknown; retryAt?: Date } = {},
  ) {
    super(message, { cause: options.cause })
    this.name = 'WeatherError'
    this.retryAt = options.retryAt ?? null
  }
  readonly retryAt: Date | null
}
