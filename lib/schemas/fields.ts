// Kinds of fields that forms share: quantities in the person's units, lines of text, boxes to tick.
import { z } from 'zod'
import { unitsOfCode, type Units } from '@/lib/units'
import { NOTE_LENGTH } from './log-choices'
import { fitted, parseNumber, rangeMessage, scaleOf, type MeasureName } from './measures'

/** A quantity in the person's units, as SI. */
export function measured(measure: MeasureName, units: Units) {
  return z.string().transform((text, context) => {
    const value = parseNumber(text)
    const valueSi = value === undefined ? NaN : scaleOf(measure, units).toSi(value)
    const fitting = fitted(measure, units, valueSi)
    if (fitting !== undefined) return fitting
    context.addIssue(value === undefined ? 'Type a number here.' : rangeMessage(measure, units))
    return z.NEVER
  })
}

/** Lays faults at the fields that they belong to. */
export const refuserIn = (context: z.RefinementCtx) => (field: string, message: string) =>
  context.addIssue({ code: 'custom', path: [field], message })

/** Hands on what another schema found, each fault at its field. */
export function passOn({ issues }: z.ZodError, context: z.RefinementCtx): void {
  for (const { path, message } of issues) context.addIssue({ code: 'custom', path, message })
}

/** The units that a form was typed in, by their code. */
const unitsSchema = z.string('Choose your units.').transform((code, context) => {
  const units = unitsOfCode(code)
  if (units) return units
  context.addIssue('Choose your units.')
  return z.NEVER
})

/** A form whose quantities are read in the units sent along with them. */
export function inUnitsOf<S extends z.ZodType>(schemaFor: (units: Units) => S) {
  return z.looseObject({ units: unitsSchema }).transform((fields, context): z.output<S> => {
    const result = schemaFor(fields.units).safeParse(fields)
    if (result.success) return result.data
    passOn(result.error, context)
    return z.NEVER
  })
}

/** What a form hides for the answers given is neither judged nor kept: nobody could see a fault of it, and mend it. */
export function withoutHidden<S extends z.ZodType>(
  namesHidden: (fields: Readonly<Record<string, unknown>>) => readonly string[],
  schema: S,
) {
  return z.preprocess((sent) => {
    if (typeof sent !== 'object' || sent === null) return sent
    const hidden = namesHidden({ ...sent })
    return Object.fromEntries(Object.entries(sent).filter(([name]) => !hidden.includes(name)))
  }, schema)
}

/** Turns what an empty field sends into no value at all. */
export function orEmpty<S extends z.ZodType>(schema: S) {
  return z.preprocess(
    (value) => (typeof value === 'string' && value.trim() === '' ? undefined : value),
    schema.optional(),
  )
}

/** Control characters would reach subjects and lists. */
export const lineOfText = (missing: string, most: number) =>
  z
    .string(missing)
    .trim()
    .min(1, missing)
    .max(most, `At most ${most} characters.`)
    .regex(/^\P{Cc}*$/u, 'Letters, figures and spaces only.')

/** A box that is not ticked sends nothing. */
export const tickSchema = z
  .literal('on')
  .optional()
  .transform((value) => value === 'on')

/** A duration as typed. [s] */
export const secondsSchema = z.string().transform((text, context) => {
  const seconds = parseNumber(text) ?? NaN
  if (seconds >= 1 && seconds <= 3600) return seconds
  context.addIssue('Between 1 and 3600 seconds.')
  return z.NEVER
})

/** A remark in one's own words, on several lines if need be. */
export const noteSchema = z
  .string()
  .default('')
  .transform((text) => text.replaceAll('\r\n', '\n').trim())
  .pipe(
    z
      .string()
      .max(NOTE_LENGTH, `At most ${NOTE_LENGTH} characters.`)
      .regex(/^[\P{Cc}\n]*$/u, 'Letters, figures and spaces only.'),
  )
