'use server'
// What can be done at a fill: start, pause, resume, look, finish, give up.
import { refresh } from 'next/cache'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { checkFillSchema, oneFillSchema, resumeFillSchema, startFillSchema } from '@/lib/schemas/fills'
import { checkFill, finishFill, giveUpFill, pauseFill, resumeFill, startFill } from '@/lib/services/fills'

export const startFillAction = formAction(startFillSchema, async (input) => {
  await startFill(await requestContext(), input)
  refresh()
})

export const pauseFillAction = formAction(oneFillSchema, async (input) => {
  await pauseFill(await requestContext(), input)
  refresh()
})

export const resumeFillAction = formAction(resumeFillSchema, async (input) => {
  await resumeFill(await requestContext(), input)
  refresh()
})

export const checkFillAction = formAction(checkFillSchema, async (input) => {
  await checkFill(await requestContext(), input)
  refresh()
  return 'Written down. The next look is due two hours from now.'
})

export const finishFillAction = formAction(oneFillSchema, async (input) => {
  await finishFill(await requestContext(), input)
  refresh()
})

export const giveUpFillAction = formAction(oneFillSchema, async (input) => {
  await giveUpFill(await requestContext(), input)
  refresh()
})
