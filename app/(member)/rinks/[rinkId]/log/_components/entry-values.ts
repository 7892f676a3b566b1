// Where the form of an entry starts: a new one by the rink's habits, an old one by what it says.
import { formatInTimeZone } from 'date-fns-tz'
import type { EntryView, LogKind } from '@/lib/schemas/log-choices'
import { scaleOf, typed } from '@/lib/schemas/measures'
import type { LogFrame } from '@/lib/services/log-book'
import type { Units } from '@/lib/units'

export type EntryValues = Record<string, string>

/** One litre more or less is the rounding of what was typed. [L] */
const SAME_WATER_L = 1

export function newValues(kind: LogKind, { usual, reader }: Pick<LogFrame, 'usual' | 'reader'>): EntryValues {
  const isWatered = kind === 'flood' || kind === 'fill'
  return {
    minutesAgo: '0',
    ...(kind === 'flood' ? { layer: typed('layer', reader.units, usual.layerMm) } : {}),
    ...(isWatered ? { waterKind: usual.waterKind } : {}),
  }
}

export function oldValues(entry: EntryView, { usual, reader }: Pick<LogFrame, 'usual' | 'reader'>): EntryValues {
  const { units, timeZone } = reader
  const { layerMm, waterL, waterTemperatureC, waterKind, thicknessMm } = entry
  // Water that follows from the layer is left to follow it.
  const follows = layerMm !== null && waterL !== null && Math.abs(layerMm * usual.areaM2 - waterL) < SAME_WATER_L
  return {
    onDate: formatInTimeZone(entry.happenedAt, timeZone, 'yyyy-MM-dd'),
    atTime: formatInTimeZone(entry.happenedAt, timeZone, 'HH:mm'),
    note: entry.note,
    ...(layerMm === null ? {} : { layer: typed('layer', units, layerMm) }),
    ...(waterL === null || follows ? {} : { water: waterTyped(waterL, units) }),
    ...(waterTemperatureC === null ? {} : { waterTemperature: typed('waterTemperature', units, waterTemperatureC) }),
    ...(waterKind === null ? {} : { waterKind }),
    ...(thicknessMm === null ? {} : { thickness: typed('iceThickness', units, thicknessMm) }),
  }
}

const waterTyped = (litres: number, units: Units) => String(Math.round(scaleOf('bucket', units).fromSi(litres)))
