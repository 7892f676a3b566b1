// Takes one device off the list.
'use client'
import { ActionForm } from '@/components/ui/action-form'
import { removeDeviceAction } from '../actions'

export function RemoveDevice({ rinkId, deviceId, name }: { rinkId: string; deviceId: string; name: string }) {
  return (
    <ActionForm action={removeDeviceAction} submit="Remove" submitLabel={`Remove ${name}`} look="plain">
      {() => (
        <>
          <input type="hidden" name="rinkId" value={rinkId} />
          <input type="hidden" name="deviceId" value={deviceId} />
        </>
      )}
    </ActionForm>
  )
}
