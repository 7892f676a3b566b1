// A button that does one thing to one source of water.
'use client'
import { ActionForm } from '@/components/ui/action-form'
import type { FormAction } from '@/lib/http/form-state'

export function OneTap({
  action,
  submit,
  rinkId,
  sourceId,
}: {
  action: FormAction
  submit: string
  rinkId: string
  sourceId: string
}) {
  return (
    <ActionForm action={action} submit={submit} look="plain">
      {() => (
        <>
          <input type="hidden" name="rinkId" value={rinkId} />
          <input type="hidden" name="sourceId" value={sourceId} />
        </>
      )}
    </ActionForm>
  )
}
