// Kinds of fields that forms share: quantities in the person's units, lines of text, boxes to tick.
import { z } from 'zod'
import { fitsMeasure, MEASURES, parseNumber, rangeMessage, type MeasureName, type UnitSystem } from './measures'

/** A quantity in the person's units, as SI. */
export function measured(measure: MeasureName, units: UnitSystem) {
  return z.string().transform((text, context) => {
    const value = parseNumber(text)
    const valueSi = value === undefined ? NaN : MEASURES[measure].scales[units].toSi(value)
    if (fitsMeasure(measure, valueSi)) return valueSi
    context.addIssue(value === undefined ? 'Type a number here.' : rangeMessage(measure, units))
    return z.NEVER
  })
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
    .regex(/^\P{Cc}*$/u, 'Letters, figures and spaces only, please.')

/** A box that is not ticked sends nothing. */
export const tickSchema = z
  .literal('on')
  .optional()
  .transform((value) => value === 'on')

/** A duration as typed. [s] */
export const secondsSchema = z.string().transform((text, context) => {
  const seconds = parseNumber(text) ?? NaN
  if (seconds > 0 && seconds <= 3600) return seconds
  context.addIssue('Between 1 and 3600 seconds, please.')
  return z.NEVER
})
