// Without a password the mailbox shows whose account it is: sign in from it once more, before the address or a password changes.
import { ActionForm } from '@/components/ui/action-form'
import { askMailboxAction } from '../actions'

export function AskMailbox({ minutes }: { minutes: number }) {
  return (
    <>
      <p className="mb-4 max-w-line">
        You have no password, so whoever holds this device could take the account along. Sign in once more by a link
        that we mail to your present address; for {minutes} minutes after that you can change the address and set a
        password.
      </p>
      <ActionForm action={askMailboxAction} submit="Send a link to my present address" look="plain" />
    </>
  )
}
