'use client'
// Takes one device off the list.
import { useActionState } from 'react'
import { Button } from '@/components/ui/button'
import { IDLE } from '@/lib/http/form-state'
import { removeDeviceAction } from '../actions'

export function RemoveDevice({ rinkId, deviceId, name }: { rinkId: string; deviceId: string; name: string }) {
  const [state, run, isPending] = useActionState(removeDeviceAction, IDLE)
  return (
    <form action={run}>
      <input type="hidden" name="rinkId" value={rinkId} />
      <input type="hidden" name="deviceId" value={deviceId} />
      <Button type="submit" disabled={isPending} aria-label={`Remove ${name}`}>
        Remove
      </Button>
      <p role="status" className="text-note text-rust empty:hidden">
        {state.status === 'error' ? state.message : null}
      </p>
    </form>
  )
}
