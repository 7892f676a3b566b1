'use server'
// Changes to one's devices.
import { refresh } from 'next/cache'
import { requestContext } from '@/lib/auth/request-context'
import { formAction } from '@/lib/http/form-action'
import { ownDeviceSchema } from '@/lib/schemas/accounts'
import { removeDevice } from '@/lib/services/push-subscriptions'

export const removeOwnDeviceAction = formAction(ownDeviceSchema, async ({ deviceId }) => {
  await removeDevice(await requestContext(), deviceId)
  refresh()
})
