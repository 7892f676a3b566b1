'use server'
// Changes what the advice for a rink depends on, one page at a time.
import type { Route } from 'next'
import { redirect } from 'next/navigation'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { serviceAction } from '@/lib/http/service-action'
import {
  changeHoursSchema,
  changeIceSchema,
  changeLimitsSchema,
  changePlaceSchema,
  changeYardSchema,
  deleteRinkSchema,
  oneWaterSchema,
  saveWaterSchema,
} from '@/lib/schemas/rink-settings'
import { deleteRink } from '@/lib/services/rink-end'
import { changeHours, changeIce, changeLimits, changePlace, changeYard } from '@/lib/services/rink-settings'
import { removeWater, saveWater, pourFromWater } from '@/lib/services/water-sources'

const SAVED = 'Saved. Tonight is being worked out anew.'

export const changePlaceAction = serviceAction(changePlaceSchema, changePlace, SAVED)
export const changeYardAction = serviceAction(changeYardSchema, changeYard, SAVED)
export const changeIceAction = serviceAction(changeIceSchema, changeIce, SAVED)
export const changeHoursAction = serviceAction(changeHoursSchema, changeHours, SAVED)
export const changeLimitsAction = serviceAction(changeLimitsSchema, changeLimits, SAVED)

export const saveWaterAction = formAction(saveWaterSchema, async (input) => {
  await saveWater(await requestContext(), input)
  redirect(`/rinks/${input.rinkId}/settings/water` as Route)
})

export const pourFromAction = serviceAction(oneWaterSchema, pourFromWater, 'Plans pour from this one now.')

export const removeWaterAction = formAction(oneWaterSchema, async (input) => {
  await removeWater(await requestContext(), input)
  redirect(`/rinks/${input.rinkId}/settings/water` as Route)
})

export const deleteRinkAction = formAction(deleteRinkSchema, async (input) => {
  await deleteRink(await requestContext(), input)
  redirect('/rinks')
})
