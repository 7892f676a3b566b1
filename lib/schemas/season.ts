// The season named in an address: the year it begins in.
import { z } from 'zod'

export const seasonSchema = z.coerce
  .number('Name the season by the year it begins in.')
  .int()
  .min(2000, 'Name the season by the year it begins in.')
  .max(2100, 'Name the season by the year it begins in.')

/** On a page, anything else means the present season. */
export const seasonYearSchema = seasonSchema.optional().catch(undefined)
