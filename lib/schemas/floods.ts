// Checking off a pass, and taking that back.
import { z } from 'zod'
import { MEASURES } from './measures'

const nightDateSchema = z.iso.date('Which night?')

const undoPassSchema = z.object({
  rinkId: z.uuid(),
  nightDate: nightDateSchema,
  passNumber: z.coerce.number().int().min(1).max(20),
})

export const checkOffPassSchema = undoPassSchema.extend({
  layerMm: z.coerce.number('How thick was it?').min(MEASURES.pouredLayer.least).max(MEASURES.pouredLayer.most),
  /** The rink's own water when absent. */
  waterTemperatureC: z.coerce.number('How warm was the water?').min(0).max(95).optional(),
})

/** As a phone sends it, at once or when it has a network again: made once, by one person, at one moment. */
export const sentCheckOffSchema = checkOffPassSchema.extend({
  entryKey: z.uuid(),
  pouredAt: z.iso.datetime().transform((text) => new Date(text)),
  userId: z.uuid(),
})

export type CheckOffPass = z.infer<typeof checkOffPassSchema>
export type SentCheckOff = z.output<typeof sentCheckOffSchema>
export type UndoPass = z.infer<typeof undoPassSchema>
