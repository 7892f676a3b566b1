'use client'
// Asks for the end of the account.
import { ActionForm } from '@/components/ui/action-form'
import { askForDeletionAction } from '../actions'
import { PresentPassword } from './present-password'

export function DeletionForm({ hasPassword }: { hasPassword: boolean }) {
  return (
    <ActionForm action={askForDeletionAction} submit="Delete my account" look="plain">
      {({ fields }) =>
        hasPassword ? <PresentPassword id="deletion-password" error={fields?.currentPassword} /> : null
      }
    </ActionForm>
  )
}
