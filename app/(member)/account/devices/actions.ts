'use server'
// Changes to one's devices.
import { serviceAction } from '@/lib/http/service-action'
import { ownDeviceSchema } from '@/lib/schemas/accounts'
import { removeDevice } from '@/lib/services/push-subscriptions'

export const removeOwnDeviceAction = serviceAction(ownDeviceSchema, (context, { deviceId }) =>
  removeDevice(context, deviceId),
)
