'use client'
// Takes one device off the list.
import { ActionForm } from '@/components/ui/action-form'
import { removeOwnDeviceAction } from '../devices/actions'

export function RemoveDevice({ deviceId, name }: { deviceId: string; name: string }) {
  return (
    <ActionForm action={removeOwnDeviceAction} submit="Remove" submitLabel={`Remove ${name}`} look="plain">
      {() => <input type="hidden" name="deviceId" value={deviceId} />}
    </ActionForm>
  )
}
