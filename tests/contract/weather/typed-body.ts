// A forecast body typed by hand: 26 hours from 2027-01-13T03:00Z in the shape of the service, every value flat but those
// that the worked example reads.

export const TYPED_NOW = new Date('2027-01-13T03:10:00Z')

const FIRST_LABEL = Date.UTC(2027, 0, 13, 3) / 1000
const HOURS = 26

/** Values by the hour of their label; every other label has `flat`. */
function column(flat: number | null, byLabel: Record<string, number | null> = {}): (number | null)[] {
  return Array.from({ length: HOURS }, (_, index) => {
    const label = String((3 + index) % 24).padStart(2, '0')
    return index < 24 && label in byLabel ? (byLabel[label] ?? null) : flat
  })
}

export const TYPED_UNITS: Record<string, string> = {
  time: 'unixtime',
  temperature_2m: '°C',
  dew_point_2m: '°C',
  relative_humidity_2m: '%',
  wind_speed_10m: 'm/s',
  wind_gusts_10m: 'm/s',
  cloud_cover: '%',
  shortwave_radiation: 'W/m²',
  precipitation: 'mm',
  rain: 'mm',
  showers: 'mm',
  snowfall: 'cm',
  surface_pressure: 'hPa',
}

export const TYPED_COLUMNS: Record<string, (number | null)[]> = {
  time: Array.from({ length: HOURS }, (_, index) => FIRST_LABEL + 3600 * index),
  temperature_2m: column(-3, { '04': -9.8 }),
  dew_point_2m: column(-5, { '04': -11.1 }),
  relative_humidity_2m: column(80, { '04': 90 }),
  wind_speed_10m: column(1, { '04': 3.11 }),
  wind_gusts_10m: column(2, { '05': 6.35 }),
  cloud_cover: column(40, { '04': 97 }),
  shortwave_radiation: column(0),
  precipitation: column(0, { '05': 0.6 }),
  rain: column(0),
  showers: column(0),
  snowfall: column(0, { '05': 0.42 }),
  surface_pressure: column(980, { '04': 971.5 }),
}

/** `columns` and `units` replace those of the same name; undefined removes one. */
export function typedBody(
  columns: Record<string, (number | null)[] | undefined> = {},
  units: Record<string, string | undefined> = {},
): string {
  return JSON.stringify({
    latitude: 46.500816,
    longitude: -94.24817,
    generationtime_ms: 0.4,
    utc_offset_seconds: 0,
    timezone: 'GMT',
    timezone_abbreviation: 'GMT',
    elevation: 372,
    hourly_units: { ...TYPED_UNITS, ...units },
    hourly: { ...TYPED_COLUMNS, ...columns },
  })
}

/** A flat column with one value at a label's hour. */
export const typedColumn = column
