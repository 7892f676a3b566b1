'use server'
// What can be changed on Tonight: a pass poured or taken back, whether it is set, the plan itself, and silence.
import { z } from 'zod'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { muteSchema } from '@/lib/schemas/alerts'
import { checkOffPassSchema } from '@/lib/schemas/floods'
import { answerSetSchema } from '@/lib/schemas/log'
import { dropOwnPassesSchema, keepOwnPassesSchema } from '@/lib/schemas/own-passes'
import { muteAlerts } from '@/lib/services/alert-preferences'
import { checkOffPass, undoPass } from '@/lib/services/floods'
import { answerSet } from '@/lib/services/log'
import { dropOwnPasses, keepOwnPasses } from '@/lib/services/own-passes'

const markPassSchema = checkOffPassSchema.extend({ isPoured: z.enum(['yes', 'no']) })

export const markPassAction = formAction(markPassSchema, async ({ isPoured, ...pass }) => {
  await (isPoured === 'yes' ? checkOffPass : undoPass)(await requestContext(), pass)
})

export const answerSetAction = formAction(answerSetSchema, async (input) => {
  await answerSet(await requestContext(), input)
})

export const keepOwnPassesAction = formAction(keepOwnPassesSchema, async (input) => {
  await keepOwnPasses(await requestContext(), input)
})

export const dropOwnPassesAction = formAction(dropOwnPassesSchema, async (input) => {
  await dropOwnPasses(await requestContext(), input)
})

export const muteAction = formAction(muteSchema, async (input) => {
  await muteAlerts(await requestContext(), input)
})
