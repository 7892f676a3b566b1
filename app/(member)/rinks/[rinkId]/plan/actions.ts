'use server'
// Keeping a building plan for its rink.
import { serviceAction } from '@/lib/http/service-action'
import { keepPlanSchema } from '@/lib/schemas/build-plan'
import { keepPlan } from '@/lib/services/build-plan'

export const keepPlanAction = serviceAction(
  keepPlanSchema,
  keepPlan,
  'Kept. The advice reckons with these from now on.',
)
