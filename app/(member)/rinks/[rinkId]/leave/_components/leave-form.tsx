'use client'
// The button that leaves.
import { ActionForm } from '@/components/ui/action-form'
import { leaveRinkAction } from '../actions'

export function LeaveForm({ rinkId }: { rinkId: string }) {
  return (
    <ActionForm action={leaveRinkAction} submit="Leave it">
      {() => <input type="hidden" name="rinkId" value={rinkId} />}
    </ActionForm>
  )
}
