// The keeper's own plan of a night, as the page sends it.
import { z } from 'zod'
import { MEASURES } from './measures'

const ownPassSchema = z.object({
  number: z.number().int().min(1).max(20),
  startsAt: z.iso.datetime().transform((text) => new Date(text)),
  layerMm: z.number('How thick?').min(MEASURES.layer.least).max(MEASURES.layer.most),
  temperatureC: z.number('How warm?').min(0).max(95),
  flowLPerMin: z.number().positive().max(5000),
})

const passesSchema = z
  .array(ownPassSchema)
  .min(1)
  .max(20)
  .refine((passes) => new Set(passes.map(({ number }) => number)).size === passes.length, 'Each pass once.')

/** A form field holds text: the passes come as JSON. */
const passesTextSchema = z.string().transform((text, context) => {
  try {
    return passesSchema.parse(JSON.parse(text))
  } catch {
    context.addIssue({ code: 'custom', message: 'The plan could not be read. Load this page again.' })
    return z.NEVER
  }
})

const nightSchema = z.object({ rinkId: z.uuid(), nightDate: z.iso.date() })

export const keepOwnPassesSchema = nightSchema.extend({ passes: passesTextSchema })
export const dropOwnPassesSchema = nightSchema

export type KeepOwnPasses = z.output<typeof keepOwnPassesSchema>
export type DropOwnPasses = z.output<typeof dropOwnPassesSchema>
