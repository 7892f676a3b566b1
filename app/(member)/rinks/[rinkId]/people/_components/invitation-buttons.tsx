'use client'
// What a keeper can still do about an invitation.
import { ActionForm } from '@/components/ui/action-form'
import { sendAgainAction, takeBackAction } from '../actions'

interface Props {
  rinkId: string
  invitationId: string
  email: string
}

export function SendAgain({ email, ...invitation }: Props) {
  return (
    <ActionForm action={sendAgainAction} submit="Send again" submitLabel={`Send again to ${email}`} look="plain">
      {() => <Which {...invitation} />}
    </ActionForm>
  )
}

export function TakeBack({ email, ...invitation }: Props) {
  return (
    <ActionForm action={takeBackAction} submit="Take back" submitLabel={`Take back from ${email}`} look="plain">
      {() => <Which {...invitation} />}
    </ActionForm>
  )
}

function Which({ rinkId, invitationId }: Omit<Props, 'email'>) {
  return (
    <>
      <input type="hidden" name="rinkId" value={rinkId} />
      <input type="hidden" name="invitationId" value={invitationId} />
    </>
  )
}
