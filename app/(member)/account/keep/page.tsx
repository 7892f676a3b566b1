// An account that is about to go: when, with what, and the way to keep it.
import type { Metadata, Route } from 'next'
import { redirect } from 'next/navigation'
import { ButtonLink } from '@/components/ui/button'
import { PageFrame } from '@/components/ui/page-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { listRinksThatGo } from '@/lib/services/account-deletion'
import { getAccount } from '@/lib/services/own-account'
import { dayOf } from '../_components/dates'
import { KeepForm } from '../_components/keep-form'

export const metadata: Metadata = { title: 'Keep the account?' }

export default async function KeepPage() {
  const context = await pageContext()
  const { deletionDueAt } = await orNotFound(getAccount(context))
  if (!deletionDueAt) redirect('/account' as Route)
  const rinks = await listRinksThatGo(context)
  return (
    <PageFrame>
      <div className="max-w-[34rem]">
        <h1 className="mb-3 text-verdict font-medium">Your account will be deleted on {dayOf(deletionDueAt)}.</h1>
        <p className="mb-5 max-w-line">
          You asked for it.
          {rinks.length > 0
            ? ` With it ${rinks.length === 1 ? 'goes' : 'go'} ${rinks.map(({ name }) => name).join(', ')}.`
            : ''}{' '}
          Until that day nothing is lost.
        </p>
        <KeepForm />
        <ButtonLink href={'/rinks' as Route} look="quiet" className="mt-3 px-0">
          Leave it at that, and go on to your rinks
        </ButtonLink>
      </div>
    </PageFrame>
  )
}
