'use client'
// The present password and the next one; who has none yet may set a first.
import { ActionForm } from '@/components/ui/action-form'
import { TextField } from '@/components/ui/field'
import { MIN_PASSWORD_LENGTH } from '@/lib/schemas/accounts'
import { changePasswordAction } from '../actions'

export function PasswordChangeForm({ email, hasPassword }: { email: string; hasPassword: boolean }) {
  return (
    <ActionForm
      action={changePasswordAction}
      submit={hasPassword ? 'Change the password' : 'Set a password'}
      look="plain"
    >
      {({ fields }) => (
        <>
          {/* Password managers file the new password under this name. */}
          <input type="email" autoComplete="username" value={email} readOnly hidden />
          {hasPassword ? (
            <TextField
              label="Present password"
              name="currentPassword"
              type="password"
              autoComplete="current-password"
              error={fields?.currentPassword}
            />
          ) : null}
          <TextField
            label="New password"
            name="newPassword"
            type="password"
            hint={`At least ${MIN_PASSWORD_LENGTH} characters. Every other device is signed out.`}
            autoComplete="new-password"
            error={fields?.newPassword}
          />
        </>
      )}
    </ActionForm>
  )
}
