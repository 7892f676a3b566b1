// Address, password, and the browsers in which one is signed in.
import type { Metadata } from 'next'
import { SignOutForm } from '@/app/(account)/_components/sign-out-form'
import { signOutEverywhereAction } from '@/app/(account)/sign-out/actions'
import { ageText } from '@/components/rinks/reader'
import { pageContext } from '@/lib/auth/request-context'
import { presentSessionHandle } from '@/lib/auth/session'
import { orNotFound } from '@/lib/http/or-not-found'
import { getAccount, isVouchedFor, VOUCHED_MINUTES } from '@/lib/services/own-account'
import { listOwnSessions } from '@/lib/services/own-sessions'
import { AccountFrame } from '../_components/account-frame'
import { AskMailbox } from '../_components/ask-mailbox'
import { dayOf } from '../_components/dates'
import { EmailChangeForm } from '../_components/email-change-form'
import { EndSession } from '../_components/end-session'
import { PasswordChangeForm } from '../_components/password-change-form'
import { Section } from '../_components/section'

export const metadata: Metadata = { title: 'Address, password, sign-ins' }

export default async function SecurityPage() {
  const context = await pageContext()
  const { email, hasPassword } = await orNotFound(getAccount(context))
  const isOwner = hasPassword || isVouchedFor(context)
  const [sessions, present] = [await listOwnSessions(context), await presentSessionHandle()]
  return (
    <AccountFrame title="Address, password, sign-ins">
      <Section title="E-mail address">
        <p className="mb-4 break-words">
          {email}
          <span className="block text-note text-graphite">It stays until the new one is confirmed.</span>
        </p>
        {isOwner ? <EmailChangeForm hasPassword={hasPassword} /> : <AskMailbox minutes={VOUCHED_MINUTES} />}
      </Section>
      <Section title="Password">
        {isOwner ? (
          <PasswordChangeForm email={email} hasPassword={hasPassword} />
        ) : (
          <p className="max-w-line">None yet. You can set one after the link above.</p>
        )}
      </Section>
      <Section title="Where you are signed in">
        <ul className="mb-5 list-none border-t border-rule p-0">
          {sessions.map(({ handle, device, createdAt, lastSeenAt }) => (
            <li key={handle} className="flex items-center justify-between gap-4 border-b border-rule py-2">
              <p className="min-w-0">
                {device || 'A browser that does not say which'}
                {handle === present ? <span className="text-graphite">, this one</span> : null}
                <span className="block text-note text-graphite">
                  seen {ageText(lastSeenAt.toISOString(), context.now.getTime())}, since {dayOf(createdAt)}
                </span>
              </p>
              {handle === present ? null : <EndSession handle={handle} device={device} />}
            </li>
          ))}
        </ul>
        <SignOutForm action={signOutEverywhereAction} submit="Sign out everywhere" />
      </Section>
    </AccountFrame>
  )
}
