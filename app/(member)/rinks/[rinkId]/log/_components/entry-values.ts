// Where the form of an entry starts: a new one by the rink's habits, an old one by what it says.
import { formatInTimeZone } from 'date-fns-tz'
import { followsLayer, type EntryView, type LogKind } from '@/lib/schemas/log-choices'
import { typed } from '@/lib/schemas/measures'
import type { LogFrame } from '@/lib/services/log-book'

export type EntryValues = Record<string, string>

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
  return {
    onDate: formatInTimeZone(entry.happenedAt, timeZone, 'yyyy-MM-dd'),
    atTime: formatInTimeZone(entry.happenedAt, timeZone, 'HH:mm'),
    note: entry.note,
    ...(layerMm === null ? {} : { layer: typed('pouredLayer', units, layerMm) }),
    ...(waterL === null || followsLayer(entry, usual.areaM2) ? {} : { water: typed('pouredWater', units, waterL) }),
    ...(waterTemperatureC === null ? {} : { waterTemperature: typed('waterTemperature', units, waterTemperatureC) }),
    ...(waterKind === null ? {} : { waterKind }),
    ...(thicknessMm === null ? {} : { thickness: typed('iceThickness', units, thicknessMm) }),
  }
}
