'use client'
// The new password, with the key of the link that allows it.
import { ActionForm } from '@/components/ui/action-form'
import { TextField } from '@/components/ui/field'
import { MIN_PASSWORD_LENGTH } from '@/lib/schemas/accounts'
import { resetPasswordAction } from '../actions'

export function NewPasswordForm({ linkKey, email }: { linkKey: string; email: string }) {
  return (
    <ActionForm action={resetPasswordAction} submit="Save and sign in">
      {({ fields }) => (
        <>
          <input type="hidden" name="key" value={linkKey} />
          {/* Password managers file the new password under this name. */}
          <input type="email" autoComplete="username" value={email} readOnly hidden />
          <TextField
            label="New password"
            name="password"
            type="password"
            hint={`At least ${MIN_PASSWORD_LENGTH} characters. Every other device is signed out.`}
            autoComplete="new-password"
            error={fields?.password}
          />
        </>
      )}
    </ActionForm>
  )
}
