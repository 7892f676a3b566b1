'use server'
// How one is told about this rink: time and ways, silence, and one's devices.
import { serviceAction } from '@/lib/http/service-action'
import { alertPreferencesSchema, muteSchema, removeDeviceSchema } from '@/lib/schemas/alerts'
import { chooseAlertPreferences, muteAlerts } from '@/lib/services/alert-preferences'
import { removeDevice } from '@/lib/services/push-subscriptions'

export const choosePreferencesAction = serviceAction(alertPreferencesSchema, chooseAlertPreferences, 'Saved.')
export const muteAction = serviceAction(muteSchema, muteAlerts)
export const removeDeviceAction = serviceAction(removeDeviceSchema, (context, { deviceId }) =>
  removeDevice(context, deviceId),
)
