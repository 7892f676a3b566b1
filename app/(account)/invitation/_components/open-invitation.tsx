// An invitation that can be taken: what it is to, and which account would join; a visitor is led to have one.
import Link from 'next/link'
import { ButtonLink } from '@/components/ui/button'
import { withNext } from '@/lib/auth/next-path'
import type { InvitationView } from '@/lib/services/joining'
import { AS_ROLE, ROLE_CAN } from '@/lib/words/roles'
import { KeyForm } from '../../_components/key-form'
import { Title } from '../../_components/title'
import { joinAction } from '../actions'

type Open = Extract<InvitationView, { state: 'open' }> & { linkKey: string }

export function OpenInvitation({ rinkName, inviterName, role, email, account, linkKey }: Open) {
  return (
    <>
      <Title lead={`${inviterName} invites you ${AS_ROLE[role]}: you could ${ROLE_CAN[role]}.`}>Join {rinkName}?</Title>
      {account ? (
        <Join account={account} email={email} linkKey={linkKey} />
      ) : (
        <AtTheDoor next={`/invitation?key=${linkKey}`} />
      )}
    </>
  )
}

function Join({
  account,
  email,
  linkKey,
}: Pick<Open, 'email' | 'linkKey'> & { account: { name: string; email: string } }) {
  return (
    <>
      <p className="mb-5 border-l-[3px] border-graphite pl-3.5 break-words">
        You are signed in as {account.name}, {account.email}. This account would join.
        {account.email === email ? null : ` The invitation was mailed to another address, ${email}.`}
      </p>
      <KeyForm action={joinAction} linkKey={linkKey} submit={`Join as ${account.name}`} />
      <p className="mt-6 text-note text-graphite">
        To join with another account,{' '}
        <Link href="/sign-out" className="py-3 text-ink underline">
          sign out
        </Link>{' '}
        and open the link in the mail again. Or{' '}
        <Link href="/rinks" className="py-3 text-ink underline">
          go to your rinks
        </Link>{' '}
        and decide later.
      </p>
    </>
  )
}

function AtTheDoor({ next }: { next: string }) {
  return (
    <>
      <p className="mb-5">Sign up or sign in first. You come back here, and choose then.</p>
      <div className="flex flex-wrap gap-3">
        <ButtonLink href={withNext('/sign-up', next)} look="main">
          Sign up
        </ButtonLink>
        <ButtonLink href={withNext('/sign-in', next)}>Sign in</ButtonLink>
      </div>
    </>
  )
}
