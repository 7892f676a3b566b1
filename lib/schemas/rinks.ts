// Setting up a rink: one set of fields for the form, the action, the service and the tests. Settings share them (rink-settings.ts).
import { z } from 'zod'
import { bucketFlowLPerMin } from '@/lib/physics/hose'
import type { Units } from '@/lib/units'
import { latitudeSchema, longitudeSchema } from './coordinates'
import { clockTimeSchema, doOverlap, EVERY_DAY, timeZoneSchema } from './local-time'
import { inUnitsOf, lineOfText, measured, orEmpty, refuserIn, secondsSchema, tickSchema, withoutHidden } from './fields'
import { fitsMeasure, rangeMessage } from './measures'
import {
  BASES,
  hasIce,
  PHASES,
  RINK_DEFAULTS,
  SHELTERS,
  SKIES,
  SKY_VIEWS,
  WATER_DEFAULTS,
  WATER_KINDS,
} from './rink-choices'

export const rinkIdSchema = z.uuid('That is no rink.')

/** What is chosen from a list. */
export const choiceFields = {
  base: z.enum(BASES, 'Choose what the rink lies on.').default('liner'),
  shelter: z.enum(SHELTERS, 'Choose how the wind reaches the rink.').default('suburban'),
  sky: z.enum(SKIES, 'Choose how much sky the rink sees.').default('edged'),
  phase: z.enum(PHASES, 'Choose what there is now.').default('waiting'),
}

export const maxPassesSchema = z.coerce
  .number()
  .int()
  .min(1, 'At least one.')
  .max(6, 'At most six.')
  .default(RINK_DEFAULTS.maxPasses)

export const placeFields = {
  name: lineOfText('Give the rink a name.', 60),
  placeName: orEmpty(lineOfText('Name the place.', 120)),
  latitude: latitudeSchema,
  longitude: longitudeSchema,
}

/** What the hose gives: as known, or by the bucket test. */
export function flowFields(units: Units) {
  return {
    flow: orEmpty(measured('flow', units)),
    bucketSize: orEmpty(measured('bucket', units)),
    bucketSeconds: orEmpty(secondsSchema),
  }
}

/** One source of water, and what is poured from it. */
export function waterFields(units: Units) {
  return {
    fillDepth: measured('fillDepth', units).default(RINK_DEFAULTS.fillDepthMm),
    waterKind: z.enum(WATER_KINDS, 'Choose where the water comes from.').default('cold-tap'),
    ...flowFields(units),
    waterTemperature: orEmpty(measured('waterTemperature', units)),
    layer: measured('layer', units).default(RINK_DEFAULTS.layerMm),
  }
}

type WaterFields = z.output<z.ZodObject<ReturnType<typeof waterFields>>>

function rinkFields(units: Units) {
  return {
    units: z.custom<Units>(),
    ...placeFields,
    timeZone: orEmpty(timeZoneSchema),
    length: measured('side', units).default(RINK_DEFAULTS.sideM),
    width: measured('side', units).default(RINK_DEFAULTS.sideM),
    ...choiceFields,
    iceThickness: orEmpty(measured('iceThickness', units)),
    ...waterFields(units),
    maxPasses: maxPassesSchema,
    hoursFrom: clockTimeSchema.default(RINK_DEFAULTS.from),
    hoursTo: clockTimeSchema.default(RINK_DEFAULTS.to),
    moreHoursFrom: orEmpty(clockTimeSchema),
    moreHoursTo: orEmpty(clockTimeSchema),
  }
}

type Fields = z.output<z.ZodObject<ReturnType<typeof rinkFields>>>

export const noHoseMessage = (units: Units) => `That would be no hose we know. ${rangeMessage('flow', units)}`

/** A bucket test needs both its numbers, and has to give a flow that a hose could have. */
export function checkFlow(fields: WaterFields, units: Units, context: z.RefinementCtx): void {
  const refuse = refuserIn(context)
  const { flow, bucketSize, bucketSeconds } = fields
  if (flow !== undefined) return
  if ((bucketSize === undefined) !== (bucketSeconds === undefined)) {
    refuse(
      bucketSize === undefined ? 'bucketSize' : 'bucketSeconds',
      'The bucket test needs both: how big, and how long.',
    )
  } else if (!fitsMeasure('flow', flowOf(fields))) {
    refuse('bucketSeconds', noHoseMessage(units))
  }
}

/** People skate on ice, not on bare ground. */
export function checkIce(
  { phase, iceThickness }: Pick<Fields, 'phase' | 'iceThickness'>,
  context: z.RefinementCtx,
): void {
  if (phase !== 'skating' || iceThickness !== 0) return
  refuserIn(context)('iceThickness', 'Ice that carries skaters has a thickness.')
}

/** What single fields cannot know: the answers have to fit each other. */
function checkTogether(fields: Fields & { units: Units }, context: z.RefinementCtx): void {
  const refuse = refuserIn(context)
  const { moreHoursFrom, moreHoursTo } = fields
  checkFlow(fields, fields.units, context)
  if (fields.hoursFrom === fields.hoursTo) refuse('hoursTo', 'These hours end when they start.')
  checkIce(fields, context)
  if ((moreHoursFrom === undefined) !== (moreHoursTo === undefined)) {
    refuse(moreHoursFrom === undefined ? 'moreHoursFrom' : 'moreHoursTo', 'These hours need a start and an end.')
  }
  if (moreHoursFrom === undefined || moreHoursTo === undefined) return
  const [first, second] = [
    { from: fields.hoursFrom, to: fields.hoursTo },
    { from: moreHoursFrom, to: moreHoursTo },
  ]
  if (moreHoursFrom === moreHoursTo) refuse('moreHoursTo', 'These hours end when they start.')
  else if (doOverlap(first, second)) refuse('moreHoursFrom', 'These hours run into the ones above.')
}

/** Without ice nobody is asked how thick it is. */
export function hiddenIceFields({ phase }: Readonly<Record<string, unknown>>): readonly string[] {
  return PHASES.some((name) => name === phase && hasIce(name)) ? [] : ['iceThickness']
}

/** Only a liner is asked how deep its water stands. */
const hiddenFields = (fields: Readonly<Record<string, unknown>>) =>
  (fields.base ?? 'liner') === 'liner' ? hiddenIceFields(fields) : [...hiddenIceFields(fields), 'fillDepth']

/** As the keeper measured it just now; undefined when nothing was said. */
export function reportedIceMm({ phase, iceThickness }: Pick<Fields, 'phase' | 'iceThickness'>): number | undefined {
  return hasIce(phase) ? iceThickness : undefined
}

/** A rink that is new to us has told nothing of its ice yet. */
function askForThickness({ phase, iceThickness }: Fields, context: z.RefinementCtx): void {
  if (phase !== 'skating' || iceThickness !== undefined) return
  refuserIn(context)('iceThickness', 'How thick is the ice? A drilled hole tells best.')
}

/** Typed, else measured by bucket, else what such a source usually gives. [L/min] */
function flowOf({ flow, bucketSize, bucketSeconds, waterKind }: WaterFields): number {
  if (flow !== undefined) return flow
  if (bucketSize !== undefined && bucketSeconds !== undefined) return bucketFlowLPerMin(bucketSize, bucketSeconds)
  return WATER_DEFAULTS[waterKind].flowLPerMin
}

/** A source as it is stored, in SI. */
export function waterOf(fields: WaterFields) {
  return {
    kind: fields.waterKind,
    flowLPerMin: flowOf(fields),
    temperatureC: fields.waterTemperature ?? WATER_DEFAULTS[fields.waterKind].temperatureC,
    layerMm: fields.layer,
    fillDepthMm: fields.fillDepth,
  }
}

/** From the fields of the form to what is stored, in SI. */
function toRink(fields: Fields) {
  const { moreHoursFrom, moreHoursTo } = fields
  const more = moreHoursFrom && moreHoursTo ? [{ from: moreHoursFrom, to: moreHoursTo }] : []
  return {
    name: fields.name,
    placeName: fields.placeName,
    latitudeDeg: fields.latitude,
    longitudeDeg: fields.longitude,
    timeZone: fields.timeZone,
    lengthM: fields.length,
    widthM: fields.width,
    base: fields.base,
    shelter: fields.shelter,
    skyView: SKY_VIEWS[fields.sky],
    phase: fields.phase,
    iceThicknessMm: reportedIceMm(fields),
    water: waterOf(fields),
    maxPasses: fields.maxPasses,
    available: [{ from: fields.hoursFrom, to: fields.hoursTo }, ...more].map((hours) => ({
      ...hours,
      weekdays: EVERY_DAY,
    })),
  }
}

export type RinkInput = ReturnType<typeof toRink>

const toldFields = {
  tellAt: clockTimeSchema.default(RINK_DEFAULTS.tellAt),
  wantsPush: tickSchema,
  wantsEmail: tickSchema,
}

const creationFields = { creationKey: z.uuid('Load this page again.'), ...toldFields }

export const setUpRinkSchema = inUnitsOf((units) =>
  withoutHidden(
    hiddenFields,
    z
      .object({ ...rinkFields(units), ...creationFields })
      .superRefine(checkTogether)
      .superRefine(askForThickness)
      .transform((fields) => ({
        creationKey: fields.creationKey,
        units: fields.units,
        rink: toRink(fields),
        told: { tellAt: fields.tellAt, wantsPush: fields.wantsPush, wantsEmail: fields.wantsEmail },
      })),
  ),
)

export type SetUpRinkInput = z.output<typeof setUpRinkSchema>
