// What the log's addresses say: filters, pages, and the file to take out. A filter that cannot be read is none.
import { z } from 'zod'
import { LOG_KINDS } from './log-choices'
import { dateSchema } from './local-time'
import { seasonSchema } from './season'

/** Given twice, the first counts. */
const single = <S extends z.ZodType>(schema: S) =>
  z.preprocess((value) => (Array.isArray(value) ? value[0] : value), schema.optional().catch(undefined))

export const logQuerySchema = z.object({
  kind: single(z.enum(LOG_KINDS)),
  person: single(z.uuid()),
  from: single(dateSchema),
  to: single(dateSchema),
  /** Nights before this one: the next page. */
  before: single(dateSchema),
  /** The form that is open. */
  write: single(z.enum(LOG_KINDS)),
})

export const logExportSchema = z.object({
  format: z.enum(['csv', 'json'], 'Choose csv or json.'),
  season: seasonSchema.optional(),
})

export type LogQuery = z.output<typeof logQuerySchema>
export type LogExportQuery = z.output<typeof logExportSchema>
