'use client'
// The present password and the next one; who has none yet may set a first.
import { ActionForm } from '@/components/ui/action-form'
import { FiledUnder, NewPasswordField, PasswordField } from '@/components/ui/person-fields'
import { changePasswordAction } from '../actions'

export function PasswordChangeForm({ email, hasPassword }: { email: string; hasPassword: boolean }) {
  return (
    <ActionForm
      action={changePasswordAction}
      submit={hasPassword ? 'Change the password' : 'Set a password'}
      look="plain"
    >
      {(state) => (
        <>
          <FiledUnder email={email} />
          {hasPassword ? <PasswordField {...state} name="currentPassword" label="Present password" /> : null}
          <NewPasswordField {...state} name="newPassword" note="Every other device is signed out." />
        </>
      )}
    </ActionForm>
  )
}
