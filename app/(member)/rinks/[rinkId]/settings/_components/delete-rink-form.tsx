// Deletes the rink, once its name has been typed.
'use client'
import { ActionForm } from '@/components/ui/action-form'
import { TextField } from '@/components/ui/field'
import { deleteRinkAction } from '../actions'

export function DeleteRinkForm({ rinkId, name }: { rinkId: string; name: string }) {
  return (
    <ActionForm action={deleteRinkAction} submit="Delete it for good">
      {({ fields, values }) => (
        <>
          <input type="hidden" name="rinkId" value={rinkId} />
          <TextField
            label="Name of the rink"
            name="name"
            hint={`Type ${name} to say that you mean it.`}
            autoComplete="off"
            defaultValue={values?.name}
            error={fields?.name}
          />
        </>
      )}
    </ActionForm>
  )
}
