// Checking off a pass, and taking that back.
import { z } from 'zod'

const nightDateSchema = z.iso.date('Which night?')

export const checkOffPassSchema = z.object({
  rinkId: z.uuid(),
  nightDate: nightDateSchema,
  passNumber: z.coerce.number().int().min(1).max(20),
  layerMm: z.coerce.number('How thick was it?').min(0.1).max(100),
})

export type CheckOffPass = z.infer<typeof checkOffPassSchema>
export type UndoPass = Omit<CheckOffPass, 'layerMm'>
