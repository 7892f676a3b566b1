'use client'
// Another address: it counts once the mail sent there was answered.
import { ActionForm } from '@/components/ui/action-form'
import { EmailField } from '@/components/ui/person-fields'
import { changeEmailAction } from '../actions'
import { PresentPassword } from './present-password'

export function EmailChangeForm({ hasPassword }: { hasPassword: boolean }) {
  return (
    <ActionForm action={changeEmailAction} submit="Send a mail there" look="plain">
      {(state) => (
        <>
          <EmailField {...state} label="New address" autoComplete="email" />
          {hasPassword ? <PresentPassword id="email-password" error={state.fields?.currentPassword} /> : null}
        </>
      )}
    </ActionForm>
  )
}
