'use server'
// What can be changed on Tonight: a pass poured or taken back, and silence.
import { z } from 'zod'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { muteSchema } from '@/lib/schemas/alerts'
import { checkOffPassSchema } from '@/lib/schemas/floods'
import { muteAlerts } from '@/lib/services/alert-preferences'
import { checkOffPass, undoPass } from '@/lib/services/floods'

const markPassSchema = checkOffPassSchema.extend({ isPoured: z.enum(['yes', 'no']) })

export const markPassAction = formAction(markPassSchema, async ({ isPoured, ...pass }) => {
  await (isPoured === 'yes' ? checkOffPass : undoPass)(await requestContext(), pass)
})

export const muteAction = formAction(muteSchema, async (input) => {
  await muteAlerts(await requestContext(), input)
})
