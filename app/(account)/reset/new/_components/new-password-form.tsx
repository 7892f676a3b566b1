'use client'
// The new password, with the key of the link that allows it.
import { ActionForm } from '@/components/ui/action-form'
import { FiledUnder, NewPasswordField } from '@/components/ui/person-fields'
import { resetPasswordAction } from '../actions'

export function NewPasswordForm({ linkKey, email }: { linkKey: string; email: string }) {
  return (
    <ActionForm action={resetPasswordAction} submit="Save and sign in">
      {(state) => (
        <>
          <input type="hidden" name="key" value={linkKey} />
          <FiledUnder email={email} />
          <NewPasswordField {...state} note="Every other device is signed out." />
        </>
      )}
    </ActionForm>
  )
}
