'use server'
// How one is told about this rink: time and ways, silence, and one's devices.
import { refresh } from 'next/cache'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { alertPreferencesSchema, muteSchema, removeDeviceSchema } from '@/lib/schemas/alerts'
import { chooseAlertPreferences, muteAlerts } from '@/lib/services/alert-preferences'
import { removeDevice } from '@/lib/services/push-subscriptions'

export const choosePreferencesAction = formAction(alertPreferencesSchema, async (input) => {
  await chooseAlertPreferences(await requestContext(), input)
  refresh()
  return 'Saved.'
})

export const muteAction = formAction(muteSchema, async (input) => {
  await muteAlerts(await requestContext(), input)
  refresh()
})

export const removeDeviceAction = formAction(removeDeviceSchema, async ({ deviceId }) => {
  await removeDevice(await requestContext(), deviceId)
  refresh()
})
