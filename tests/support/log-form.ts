// What people type into the log, as its forms send it.
import { randomUUID } from 'node:crypto'
import { changeEntrySchema, writeEntrySchema } from '@/lib/schemas/log'
import { unitsCode, METRIC } from '@/lib/units'

type Fields = Record<string, string>

/** A flood just now, unless `changes` says otherwise. */
export function entryForm(rinkId: string, changes: Fields = {}): Fields {
  return { rinkId, units: unitsCode(METRIC), kind: 'flood', entryKey: randomUUID(), minutesAgo: '0', ...changes }
}

export const typedEntry = (rinkId: string, changes: Fields = {}) => writeEntrySchema.parse(entryForm(rinkId, changes))

export const typedChange = (rinkId: string, entryId: string, version: number, changes: Fields = {}) =>
  changeEntrySchema.parse({ ...entryForm(rinkId), entryId, version: String(version), ...changes })
