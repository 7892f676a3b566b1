// Changing a rink's settings, one page at a time. Fields are those of set-up (rinks.ts) and what only settings ask.
import { z } from 'zod'
import type { FloorShape } from '@/lib/physics/floor'
import type { Units } from '@/lib/units'
import { inUnitsOf, measured, orEmpty, refuserIn, withoutHidden } from './fields'
import { cornerFields, cornersOf, hiddenFloorFields, parseGrid } from './floor'
import { readHours } from './hours'
import { timeZoneSchema } from './local-time'
import { FLOOR_KINDS, SKIES, SKY_VIEWS } from './rink-choices'
import {
  choiceFields,
  checkFlow,
  checkIce,
  hiddenIceFields,
  maxPassesSchema,
  placeFields,
  reportedIceMm,
  rinkIdSchema,
  waterFields,
  waterOf,
} from './rinks'

export const changePlaceSchema = withoutHidden(
  ({ zoneBy }) => (zoneBy === 'keeper' ? [] : ['timeZone']),
  z
    .object({
      rinkId: rinkIdSchema,
      ...placeFields,
      zoneBy: z.enum(['place', 'keeper'], 'Choose whose clock counts.').default('place'),
      timeZone: orEmpty(timeZoneSchema),
    })
    .superRefine(({ zoneBy, timeZone }, context) => {
      if (zoneBy === 'keeper' && !timeZone) refuserIn(context)('timeZone', 'Choose the zone.')
    })
    .transform(({ latitude, longitude, timeZone, zoneBy, ...rest }) => ({
      ...rest,
      latitudeDeg: latitude,
      longitudeDeg: longitude,
      /** Undefined follows from the place. */
      timeZone: zoneBy === 'keeper' ? timeZone : undefined,
    })),
)

function yardFields(units: Units) {
  return {
    rinkId: rinkIdSchema,
    length: measured('side', units),
    width: measured('side', units),
    base: choiceFields.base,
    shelter: choiceFields.shelter,
    /** A share that was set by hand stays as it is. */
    sky: z.enum([...SKIES, 'kept'], 'Choose how much sky the rink sees.'),
    floorKind: z.enum(FLOOR_KINDS, 'Choose how you measured the floor.').default('level'),
    ...cornerFields(units),
    grid: z.string().max(4000, 'That is too long.').default(''),
    boardHeight: orEmpty(measured('boardHeight', units)),
  }
}

type YardFields = z.output<z.ZodObject<ReturnType<typeof yardFields>>>

function floorFrom(fields: YardFields, units: Units, context: z.RefinementCtx): FloorShape | null {
  if (fields.floorKind === 'level') return null
  if (fields.floorKind === 'corners') return cornersOf(fields)
  const grid = parseGrid(fields.grid, units)
  if (!('fault' in grid)) return grid
  refuserIn(context)('grid', grid.fault)
  return null
}

export const changeYardSchema = inUnitsOf((units) =>
  withoutHidden(
    ({ floorKind }) => hiddenFloorFields(floorKind, ['grid']),
    z.object(yardFields(units)).transform((fields, context) => ({
      rinkId: fields.rinkId,
      lengthM: fields.length,
      widthM: fields.width,
      base: fields.base,
      shelter: fields.shelter,
      skyView: fields.sky === 'kept' ? undefined : SKY_VIEWS[fields.sky],
      floor: floorFrom(fields, units, context),
      boardHeightMm: fields.boardHeight ?? null,
    })),
  ),
)

export const changeIceSchema = inUnitsOf((units) =>
  withoutHidden(
    hiddenIceFields,
    z
      .object({
        rinkId: rinkIdSchema,
        phase: choiceFields.phase,
        iceThickness: orEmpty(measured('iceThickness', units)),
      })
      .superRefine(checkIce)
      .transform(({ rinkId, ...ice }) => ({ rinkId, phase: ice.phase, iceThicknessMm: reportedIceMm(ice) })),
  ),
)

export const saveWaterSchema = inUnitsOf((units) =>
  z
    .object({ rinkId: rinkIdSchema, sourceId: orEmpty(z.uuid('That is no source.')), ...waterFields(units) })
    .superRefine((fields, context) => checkFlow(fields, units, context))
    .transform((fields) => ({
      rinkId: fields.rinkId,
      sourceId: fields.sourceId,
      water: waterOf(fields),
    })),
)

export const oneWaterSchema = z.object({ rinkId: rinkIdSchema, sourceId: z.uuid('That is no source.') })

export const changeHoursSchema = z
  .looseObject({ rinkId: rinkIdSchema, maxPasses: maxPassesSchema })
  .transform(({ rinkId, maxPasses, ...fields }, context) => ({
    rinkId,
    maxPasses,
    available: readHours(fields, context),
  }))

export const changeLimitsSchema = inUnitsOf((units) =>
  z
    .object({
      rinkId: rinkIdSchema,
      windLimit: orEmpty(measured('windLimit', units)),
      windChillLimit: orEmpty(measured('windChill', units)),
      carriesSkater: measured('carriesSkater', units),
    })
    .transform(({ rinkId, windLimit, windChillLimit, carriesSkater }) => ({
      rinkId,
      windLimitMps: windLimit ?? null,
      windChillLimitC: windChillLimit ?? null,
      carriesSkaterMm: carriesSkater,
    })),
)

export const deleteRinkSchema = z.object({
  rinkId: rinkIdSchema,
  name: z
    .string('Type the name of the rink.')
    .trim()
    .min(1, 'Type the name of the rink.')
    .max(200, 'That is not its name.'),
})

export const leaveRinkSchema = z.object({ rinkId: rinkIdSchema })

export type ChangePlaceInput = z.output<typeof changePlaceSchema>
export type ChangeYardInput = z.output<typeof changeYardSchema>
export type ChangeIceInput = z.output<typeof changeIceSchema>
export type SaveWaterInput = z.output<typeof saveWaterSchema>
export type OneWaterInput = z.output<typeof oneWaterSchema>
export type ChangeHoursInput = z.output<typeof changeHoursSchema>
export type ChangeLimitsInput = z.output<typeof changeLimitsSchema>
export type DeleteRinkInput = z.output<typeof deleteRinkSchema>
