'use server'
// What can be done at a fill: start, pause, resume, look, finish, give up.
import { serviceAction } from '@/lib/http/service-action'
import { checkFillSchema, oneFillSchema, resumeFillSchema, startFillSchema } from '@/lib/schemas/fills'
import { checkFill, finishFill, giveUpFill, pauseFill, resumeFill, startFill } from '@/lib/services/fills'

export const startFillAction = serviceAction(startFillSchema, startFill)
export const pauseFillAction = serviceAction(oneFillSchema, pauseFill)
export const resumeFillAction = serviceAction(resumeFillSchema, resumeFill)
export const checkFillAction = serviceAction(
  checkFillSchema,
  checkFill,
  'Written down. The next look is due two hours from now.',
)
export const finishFillAction = serviceAction(oneFillSchema, finishFill)
export const giveUpFillAction = serviceAction(oneFillSchema, giveUpFill)
