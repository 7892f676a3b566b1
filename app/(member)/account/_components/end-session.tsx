'use client'
// Signs another browser out.
import { ActionForm } from '@/components/ui/action-form'
import { endSessionAction } from '../actions'

export function EndSession({ handle, device }: { handle: string; device: string }) {
  return (
    <ActionForm action={endSessionAction} submit="End" submitLabel={`End ${device || 'that browser'}`} look="plain">
      {() => <input type="hidden" name="handle" value={handle} />}
    </ActionForm>
  )
}
