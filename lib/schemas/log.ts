// Writing into the log, changing it, answering for a flood: the fields as people type them, in their own units.
import { z } from 'zod'
import { MINUTES_A_DAY } from '@/lib/advice/time-of-day'
import type { Units } from '@/lib/units'
import { inUnitsOf, measured, noteSchema, orEmpty, refuserIn } from './fields'
import { LOG_KINDS, OUTCOMES, WHICH_HOURS } from './log-choices'
import { clockTimeSchema, dateSchema } from './local-time'
import { parseNumber } from './measures'
import { WATER_KINDS } from './rink-choices'
import { rinkIdSchema } from './rinks'

const WEEK_MINUTES = 7 * MINUTES_A_DAY

const entryIdSchema = z.uuid('That is no entry.')
const versionSchema = z.coerce.number('Load this page again.').int().min(1)

const minutesAgoSchema = z.string().transform((text, context) => {
  const minutes = parseNumber(text) ?? NaN
  if (minutes >= 0 && minutes <= WEEK_MINUTES) return minutes
  context.addIssue('A number of minutes, or give date and time.')
  return z.NEVER
})

/** When it happened: minutes ago, or by the rink's clock. A time alone is the last time the clock showed it. */
const whenFields = {
  minutesAgo: orEmpty(minutesAgoSchema),
  onDate: orEmpty(dateSchema),
  atTime: orEmpty(clockTimeSchema),
  whichHour: orEmpty(z.enum(WHICH_HOURS)),
}

function entryFields(units: Units) {
  return {
    rinkId: rinkIdSchema,
    kind: z.enum(LOG_KINDS, 'Choose what was done.'),
    layer: orEmpty(measured('pouredLayer', units)),
    water: orEmpty(measured('pouredWater', units)),
    waterTemperature: orEmpty(measured('waterTemperature', units)),
    waterKind: orEmpty(z.enum(WATER_KINDS, 'Choose where the water came from.')),
    thickness: orEmpty(measured('iceThickness', units)),
    note: noteSchema,
    ...whenFields,
  }
}

type Fields = z.output<z.ZodObject<ReturnType<typeof entryFields>>>

/** What single fields cannot know: what each kind cannot do without. */
function checkTogether(fields: Fields, context: z.RefinementCtx): void {
  const refuse = refuserIn(context)
  if (fields.kind === 'fill' && fields.water === undefined) refuse('water', 'How much water went in?')
  if (fields.kind === 'reading' && fields.thickness === undefined) refuse('thickness', 'How thick is the ice?')
  if (fields.kind === 'note' && fields.note === '') refuse('note', 'Write what there is to note.')
  if (fields.onDate !== undefined && fields.atTime === undefined) refuse('atTime', 'At what time?')
}

/** From the fields of the form to what a service is told, in SI. What another kind would have is left out. */
function toEntry(fields: Fields) {
  const { kind, minutesAgo, onDate, atTime, whichHour } = fields
  const isWatered = kind === 'flood' || kind === 'fill'
  return {
    rinkId: fields.rinkId,
    kind,
    when: { minutesAgo, onDate, atTime, whichHour },
    layerMm: kind === 'flood' ? fields.layer : undefined,
    waterL: isWatered ? fields.water : undefined,
    waterTemperatureC: isWatered ? fields.waterTemperature : undefined,
    waterKind: isWatered ? fields.waterKind : undefined,
    thicknessMm: kind === 'reading' ? fields.thickness : undefined,
    note: fields.note,
  }
}

export type EntryInput = ReturnType<typeof toEntry>
export type When = EntryInput['when']

export const writeEntrySchema = inUnitsOf((units) =>
  z
    .object({ entryKey: z.uuid('Load this page again.'), ...entryFields(units) })
    .superRefine(checkTogether)
    .transform((fields) => ({ entryKey: fields.entryKey, ...toEntry(fields) })),
)

export const changeEntrySchema = inUnitsOf((units) =>
  z
    .object({ entryId: entryIdSchema, version: versionSchema, ...entryFields(units) })
    .superRefine(checkTogether)
    .transform((fields) => ({ entryId: fields.entryId, version: fields.version, units, ...toEntry(fields) })),
)

export const entrySchema = z.object({ rinkId: rinkIdSchema, entryId: entryIdSchema })

/** What somebody found of a flood; an empty time is now, "none" takes an answer back. */
export const answerSetSchema = z.object({
  rinkId: rinkIdSchema,
  entryId: entryIdSchema,
  version: versionSchema,
  outcome: z.enum([...OUTCOMES, 'none'], 'Choose what you found.'),
  atTime: orEmpty(clockTimeSchema),
})

export type WriteEntryInput = z.output<typeof writeEntrySchema>
export type ChangeEntryInput = z.output<typeof changeEntrySchema>
export type EntryId = z.output<typeof entrySchema>
export type AnswerSetInput = z.output<typeof answerSetSchema>
