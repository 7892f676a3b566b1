// What a promised alert carries: finished words, so that what is sent is what was decided. Links are added on delivery.
import { z } from 'zod'
import { roleSchema } from './people'

const wordsSchema = z.object({
  rinkName: z.string(),
  nightLabel: z.string(),
  sentence: z.string(),
  sure: z.string(),
  passes: z.array(z.object({ at: z.string(), what: z.string() })),
  cautions: z.array(z.string()),
  why: z.array(z.string()),
})

export const alertContentSchema = z.object({
  rinkId: z.uuid(),
  nightDate: z.iso.date(),
  /** The thaw that is told of: what is told once is read back from here. */
  thaw: z.object({ startsAt: z.iso.datetime(), endsAt: z.iso.datetime() }).optional(),
  words: wordsSchema,
})

/** A look at the hose of a running fill: one sentence says what to look at, the next how far the fill is. */
export const fillCheckContentSchema = z.object({
  rinkId: z.uuid(),
  words: z.object({ rinkName: z.string(), sentence: z.string(), progress: z.string(), cautions: z.array(z.string()) }),
})

/** The day to fill: which night, from when, and its words. What is told once is read back from here. */
export const fillDayContentSchema = z.object({
  rinkId: z.uuid(),
  fillDate: z.iso.date(),
  startsAt: z.iso.datetime(),
  words: z.object({
    rinkName: z.string(),
    nightLabel: z.string(),
    sentence: z.string(),
    /** What becomes of what was told before; empty at the first word. */
    before: z.string(),
    sure: z.string(),
    plan: z.string(),
    /** That it is no decision yet; empty when it is. */
    caveat: z.string(),
    ready: z.array(z.string()),
    cautions: z.array(z.string()),
  }),
})

/** Account mail names its link; the note about a known address has none. */
export const linkContentSchema = z.object({ linkId: z.uuid() })

/** A test of one device names it. */
export const testContentSchema = z.object({ deviceId: z.uuid().optional() })

/** The note about a changed address goes to the one that was left. Read by the query that delivers it. */
export type AddressChangedContent = { oldEmail: string }

/** An invitation names its row, which knows the address. */
export const invitationContentSchema = z.object({
  invitationId: z.uuid(),
  words: z.object({ rinkName: z.string(), inviterName: z.string(), role: roleSchema }),
})

export const deletionContentSchema = z.object({ dueAt: z.iso.datetime() })

export type AlertContent = z.infer<typeof alertContentSchema>
export type InvitationContent = z.infer<typeof invitationContentSchema>
export type FillDayContent = z.infer<typeof fillDayContentSchema>
export type FillCheckContent = z.infer<typeof fillCheckContentSchema>
