'use client'
// The address that the link goes to.
import { ActionForm } from '@/components/ui/action-form'
import { TextField } from '@/components/ui/field'
import { sendResetLinkAction } from '../actions'

export function ResetRequestForm() {
  return (
    <ActionForm action={sendResetLinkAction} submit="Send me a link">
      {({ fields, values }) => (
        <TextField
          label="E-mail"
          name="email"
          type="email"
          autoComplete="username"
          defaultValue={values?.email}
          error={fields?.email}
        />
      )}
    </ActionForm>
  )
}
