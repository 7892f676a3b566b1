// Everything of one's account to take along, and its end.
import type { Metadata } from 'next'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { GRACE_DAYS, listRinksThatGo } from '@/lib/services/account-deletion'
import { getAccount } from '@/lib/services/own-account'
import { AccountFrame } from '../_components/account-frame'
import { dayOf } from '../_components/dates'
import { DeletionForm } from '../_components/deletion-form'
import { KeepForm } from '../_components/keep-form'
import { Section } from '../_components/section'

export const metadata: Metadata = { title: 'Your data' }

export default async function DataPage() {
  const context = await pageContext()
  const { hasPassword, deletionDueAt } = await orNotFound(getAccount(context))
  const rinks = await listRinksThatGo(context)
  return (
    <AccountFrame title="Your data">
      <Section title="Take everything along">
        <p className="mb-4 max-w-line">
          One JSON file: your account, your rinks with their settings and logs, whom you invited, your alerts and what
          you were told. No passwords and no keys are in it.
        </p>
        <a
          href="/api/account/export"
          download
          className="inline-flex min-h-touch items-center rounded border-[1.5px] border-ink px-[18px] font-medium no-underline"
        >
          Download it
        </a>
      </Section>
      {deletionDueAt ? (
        <PendingDeletion dueAt={deletionDueAt} rinks={rinks} />
      ) : (
        <AskForDeletion rinks={rinks} hasPassword={hasPassword} />
      )}
    </AccountFrame>
  )
}

type Rinks = Awaited<ReturnType<typeof listRinksThatGo>>

function PendingDeletion({ dueAt, rinks }: { dueAt: Date; rinks: Rinks }) {
  return (
    <Section title="The account is to be deleted">
      <p className="mb-4 max-w-line border-l-[3px] border-rust pl-3.5">
        You asked for it, and it will be deleted on {dayOf(dueAt)}
        {rinks.length > 0 ? `, and with it ${rinks.map(({ name }) => name).join(', ')}` : ''}. Until that day nothing is
        lost.
      </p>
      <KeepForm />
    </Section>
  )
}

function AskForDeletion({ rinks, hasPassword }: { rinks: Rinks; hasPassword: boolean }) {
  return (
    <Section title="Delete the account">
      <p className="mb-3 max-w-line">
        It is deleted {GRACE_DAYS} days after you ask, and we mail you the day. Until then you may sign in and keep it.
        Afterwards it is gone for good; what you wrote in other people’s logs stays there without your name.
      </p>
      {rinks.length > 0 ? (
        <p className="mb-4 max-w-line border-l-[3px] border-rust pl-3.5">
          Only you keep {rinks.map(({ name }) => name).join(', ')}: {rinks.length === 1 ? 'it goes' : 'they go'} too,
          for everybody. To leave {rinks.length === 1 ? 'it' : 'them'} to others, make one of its people keeper first.
        </p>
      ) : null}
      <DeletionForm hasPassword={hasPassword} />
    </Section>
  )
}
