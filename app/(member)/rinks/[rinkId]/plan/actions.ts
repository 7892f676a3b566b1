'use server'
// Keeping a building plan for its rink.
import { refresh } from 'next/cache'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { keepPlanSchema } from '@/lib/schemas/build-plan'
import { keepPlan } from '@/lib/services/build-plan'

export const keepPlanAction = formAction(keepPlanSchema, async (input) => {
  await keepPlan(await requestContext(), input)
  refresh()
  return 'Kept. The advice reckons with these from now on.'
})
