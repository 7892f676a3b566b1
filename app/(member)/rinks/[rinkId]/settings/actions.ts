'use server'
// Changes what the advice for a rink depends on, one page at a time.
import type { Route } from 'next'
import { refresh } from 'next/cache'
import { redirect } from 'next/navigation'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
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

export const changePlaceAction = formAction(changePlaceSchema, async (input) => {
  await changePlace(await requestContext(), input)
  refresh()
  return SAVED
})

export const changeYardAction = formAction(changeYardSchema, async (input) => {
  await changeYard(await requestContext(), input)
  refresh()
  return SAVED
})

export const changeIceAction = formAction(changeIceSchema, async (input) => {
  await changeIce(await requestContext(), input)
  refresh()
  return SAVED
})

export const changeHoursAction = formAction(changeHoursSchema, async (input) => {
  await changeHours(await requestContext(), input)
  refresh()
  return SAVED
})

export const changeLimitsAction = formAction(changeLimitsSchema, async (input) => {
  await changeLimits(await requestContext(), input)
  refresh()
  return SAVED
})

export const saveWaterAction = formAction(saveWaterSchema, async (input) => {
  await saveWater(await requestContext(), input)
  redirect(`/rinks/${input.rinkId}/settings/water` as Route)
})

export const pourFromAction = formAction(oneWaterSchema, async (input) => {
  await pourFromWater(await requestContext(), input)
  refresh()
  return 'Plans pour from this one now.'
})

export const removeWaterAction = formAction(oneWaterSchema, async (input) => {
  await removeWater(await requestContext(), input)
  redirect(`/rinks/${input.rinkId}/settings/water` as Route)
})

export const deleteRinkAction = formAction(deleteRinkSchema, async (input) => {
  await deleteRink(await requestContext(), input)
  redirect('/rinks')
})
