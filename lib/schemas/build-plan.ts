// The fields of the building plan as people type them, and what they come to: for the sums, and for the rink. The browser and the server read them alike.
import { z } from 'zod'
import type { BuildInput } from '@/lib/advice/build-types'
import type { FloorShape } from '@/lib/physics/floor'
import { bucketFlowLPerMin } from '@/lib/physics/hose'
import { unitsOfCode, type Units } from '@/lib/units'
import { measured, orEmpty, passOn, refuserIn, withoutHidden } from './fields'
import { cornerFields, cornersOf, hiddenFloorFields } from './floor'
import { fitsMeasure, parseNumber } from './measures'
import { FLOOR_KINDS } from './rink-choices'
import { flowFields, noHoseMessage, rinkIdSchema } from './rinks'

/** Points along one side of the grid, as the stored floor has them at most (floor.ts). */
export const GRID = { least: 2, most: 20, usualRows: 4, usualColumns: 3 }

export const pointField = (row: number, column: number) => `point-${row}-${column}`

const LINER_STEP_FOOT_M = 0.3048

const pointsSchema = z.coerce
  .number('A whole number.')
  .int('A whole number.')
  .min(GRID.least, `At least ${GRID.least}.`)
  .max(GRID.most, `At most ${GRID.most}.`)

const hoursSchema = z.string().transform((text, context) => {
  const hours = parseNumber(text) ?? NaN
  if (hours >= 0.25 && hours <= 24) return hours
  context.addIssue('Between a quarter of an hour and 24 hours.')
  return z.NEVER
})

function planFields(units: Units) {
  return {
    length: measured('side', units),
    width: measured('side', units),
    floorKind: z.enum(FLOOR_KINDS, 'Choose how you measured the floor.').default('level'),
    ...cornerFields(units),
    rows: pointsSchema.default(GRID.usualRows),
    columns: pointsSchema.default(GRID.usualColumns),
    leastDepth: measured('leastDepth', units),
    ...flowFields(units),
    hoursInOneGo: orEmpty(hoursSchema),
    waterPrice: orEmpty(measured('waterPrice', units)),
    boardHeight: orEmpty(measured('boardHeight', units)),
    freeboard: orEmpty(measured('freeboard', units)),
    season: z.coerce.number('Choose an autumn.').int().min(2000).max(2100),
  }
}

type Fields = z.output<z.ZodObject<ReturnType<typeof planFields>>>
type Typed = Record<string, string | undefined>

/** An empty point lies at the string. */
function floorOfFields(fields: Fields, typed: Typed, units: Units, context: z.RefinementCtx): FloorShape | null {
  if (fields.floorKind === 'level') return null
  if (fields.floorKind === 'corners') return cornersOf(fields)
  const drop = orEmpty(measured('drop', units))
  const depthsM = Array.from({ length: fields.rows }, (_, row) =>
    Array.from({ length: fields.columns }, (_, column) => {
      const name = pointField(row + 1, column + 1)
      const depth = drop.safeParse(typed[name])
      if (!depth.success) {
        refuserIn(context)(name, depth.error.issues[0]?.message ?? '')
      }
      return (depth.data ?? 0) / 1000
    }),
  )
  return { depthsM }
}

/** A bucket that was timed counts before a flow that was typed. [L/min] */
function flowOfFields({ flow, bucketSize, bucketSeconds }: Fields, units: Units, context: z.RefinementCtx): number {
  const refuse = refuserIn(context)
  if (bucketSize !== undefined && bucketSeconds !== undefined) {
    const lPerMin = bucketFlowLPerMin(bucketSize, bucketSeconds)
    if (!fitsMeasure('flow', lPerMin)) refuse('bucketSeconds', noHoseMessage(units))
    return lPerMin
  }
  if (bucketSeconds !== undefined) refuse('bucketSize', 'How big is the bucket?')
  if (flow === undefined) refuse('flow', 'Type the flow, or time a bucket.')
  return flow ?? NaN
}

function toInput(fields: Fields, typed: Typed, units: Units, context: z.RefinementCtx): BuildInput {
  const { bucketSize, bucketSeconds } = fields
  const lPerMin = flowOfFields(fields, units, context)
  return {
    lengthM: fields.length,
    widthM: fields.width,
    floor: floorOfFields(fields, typed, units, context),
    leastDepthM: fields.leastDepth / 1000,
    flow:
      bucketSize !== undefined && bucketSeconds !== undefined ? { bucketL: bucketSize, bucketSeconds } : { lPerMin },
    hoursPerSession: fields.hoursInOneGo,
    waterPricePerM3: fields.waterPrice ?? null,
    boardHeightM: fields.boardHeight === undefined ? null : fields.boardHeight / 1000,
    ...(fields.freeboard === undefined ? {} : { freeboardM: fields.freeboard / 1000 }),
    ...(units.size === 'ft' ? { linerStepM: LINER_STEP_FOOT_M } : {}),
    seasonYear: fields.season,
  }
}

/** What was typed, as the sums take it. */
export function buildPlanSchema(units: Units) {
  const fields = withoutHidden(
    ({ floorKind }) => hiddenFloorFields(floorKind, ['rows', 'columns']),
    z.object(planFields(units)),
  )
  return z.record(z.string(), z.string().optional()).transform((typed, context): BuildInput => {
    const result = fields.safeParse(typed)
    if (result.success) return toInput(result.data, typed, units, context)
    passOn(result.error, context)
    return z.NEVER
  })
}

/** The same, to be kept for a rink. */
export const keepPlanSchema = z.looseObject({ rinkId: rinkIdSchema, units: z.string() }).transform((typed, context) => {
  const units = unitsOfCode(typed.units)
  if (!units) {
    refuserIn(context)('units', 'Choose your units.')
    return z.NEVER
  }
  const result = buildPlanSchema(units).safeParse(typed)
  if (result.success) return { rinkId: typed.rinkId, plan: result.data }
  passOn(result.error, context)
  return z.NEVER
})

export type KeepPlanInput = z.output<typeof keepPlanSchema>
