// What an entry says where the person left a field empty: the rink's own layer, area and water.
import { findHourOfSheet } from '@/db/queries/log-sheets'
import type { EntryValues, LogEntry } from '@/db/queries/log-entries'
import { listWaterSources } from '@/db/queries/water-sources'
import type { RinkForJudging } from '@/db/queries/rinks'
import type { Db } from '@/db/knex'
import type { RinkAccess } from '@/lib/access/proofs'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { ChangeEntryInput, EntryInput } from '@/lib/schemas/log'
import { followsLayer } from '@/lib/schemas/log-choices'
import { MEASURES, unlessAsShown, type MeasureName } from '@/lib/schemas/measures'
import { WATER_DEFAULTS } from '@/lib/schemas/rink-choices'

/** The model's set time is for the rink's usual layer; a film more makes no difference that anybody could see. [mm] Ours. */
const SAME_LAYER_MM = 0.5

type SaidValues = Pick<EntryValues, 'layerMm' | 'waterL' | 'waterTemperatureC' | 'waterKind' | 'thicknessMm' | 'note'>

export async function entryValues(
  db: Db,
  access: RinkAccess,
  input: EntryInput,
  rink: RinkForJudging,
): Promise<SaidValues> {
  const { kind, note, thicknessMm = null } = input
  if (kind !== 'flood' && kind !== 'fill') {
    return { layerMm: null, waterL: null, waterTemperatureC: null, waterKind: null, thicknessMm, note }
  }
  const waterKind = input.waterKind ?? rink.water.kind
  const source = (await listWaterSources(db, access)).find((known) => known.kind === waterKind)
  const waterTemperatureC = input.waterTemperatureC ?? (source ?? WATER_DEFAULTS[waterKind]).temperatureC
  const areaM2 = rink.lengthM * rink.widthM
  const layerMm = kind === 'flood' ? (input.layerMm ?? layerOf(input.waterL, areaM2) ?? rink.water.layerMm) : null
  // 1 L over 1 m² is 1 mm.
  const waterL = input.waterL ?? (layerMm ?? 0) * areaM2
  return { layerMm, waterL, waterTemperatureC, waterKind, thicknessMm: null, note }
}

function layerOf(waterL: number | undefined, areaM2: number): number | undefined {
  if (waterL === undefined) return undefined
  const { least, most } = MEASURES.pouredLayer
  return Math.min(most, Math.max(least, waterL / areaM2))
}

/** The input with the figures of the entry where the form sent them back as it had shown them, rounded. */
export function withUnchanged(
  input: ChangeEntryInput,
  before: LogEntry,
  { lengthM, widthM }: RinkForJudging,
): ChangeEntryInput {
  const unless = (measure: MeasureName, sent: number | undefined, stored: number | null) =>
    sent === undefined || stored === null ? sent : unlessAsShown(measure, input.units, sent, stored)
  const layerMm = unless('pouredLayer', input.layerMm, before.layerMm)
  const isFollowing = input.waterL === undefined && layerMm === before.layerMm && followsLayer(before, lengthM * widthM)
  return {
    ...input,
    layerMm,
    waterL: isFollowing ? (before.waterL ?? undefined) : unless('pouredWater', input.waterL, before.waterL),
    waterTemperatureC: unless('waterTemperature', input.waterTemperatureC, before.waterTemperatureC),
    thicknessMm: unless('iceThickness', input.thicknessMm, before.thicknessMm),
  }
}

/**
 * When the model said that a flood written by hand would be set, had somebody looked when it was poured. Null for what
 * was poured before the model's last word, because nobody was told, and for layers that its word was not about.
 */
export async function saidForFlood(
  db: Db,
  access: RinkAccess,
  pouredAt: Date,
  { layerMm, waterTemperatureC }: SaidValues,
  { water }: RinkForJudging,
): Promise<Date | null> {
  const hour = await findHourOfSheet(db, access, pouredAt)
  if (!hour?.setsAt || pouredAt.getTime() < hour.judgedAt.getTime() - HOUR_MILLIS) return null
  const isUsual = Math.abs((layerMm ?? 0) - water.layerMm) <= SAME_LAYER_MM && waterTemperatureC === water.temperatureC
  if (!isUsual) return null
  return new Date(hour.setsAt.getTime() + pouredAt.getTime() - hour.startsAt.getTime())
}
