'use client'
// The address that the link goes to.
import { ActionForm } from '@/components/ui/action-form'
import { EmailField } from '@/components/ui/person-fields'
import { sendResetLinkAction } from '../actions'

export function ResetRequestForm() {
  return (
    <ActionForm action={sendResetLinkAction} submit="Send me a link">
      {(state) => <EmailField {...state} />}
    </ActionForm>
  )
}
