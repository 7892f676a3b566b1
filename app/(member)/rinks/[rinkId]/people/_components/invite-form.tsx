'use client'
// Asks somebody in by mail.
import { ActionForm } from '@/components/ui/action-form'
import { EmailField } from '@/components/ui/person-fields'
import { inviteAction } from '../actions'
import { RoleChoice } from './role-choice'

export function InviteForm({ rinkId }: { rinkId: string }) {
  return (
    <ActionForm action={inviteAction} submit="Send the invitation">
      {({ status, fields, values }) => (
        <>
          <input type="hidden" name="rinkId" value={rinkId} />
          {/* What went out is said above; the next address starts empty. */}
          <EmailField fields={fields} values={status === 'error' ? values : undefined} autoComplete="off" />
          <RoleChoice legend="As" role="crew" error={fields?.role} />
        </>
      )}
    </ActionForm>
  )
}
