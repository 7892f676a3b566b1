// What a promised alert carries: finished words, so that what is sent is what was decided. Links are added on delivery.
import { z } from 'zod'

const wordsSchema = z.object({
  rinkName: z.string(),
  nightLabel: z.string(),
  sentence: z.string(),
  sure: z.string(),
  passes: z.array(z.object({ at: z.string(), what: z.string() })),
  cautions: z.array(z.string()),
  why: z.array(z.string()),
})

export const alertContentSchema = z.object({ rinkId: z.uuid(), nightDate: z.iso.date(), words: wordsSchema })

/** Account mail names its link; the note about a known address has none. */
export const linkContentSchema = z.object({ linkId: z.uuid() })

export type AlertContent = z.infer<typeof alertContentSchema>
