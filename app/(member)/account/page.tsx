// One's own account: how one reads figures, one's rinks, and the ways to everything else of it.
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { SignOutForm } from '@/app/(account)/_components/sign-out-form'
import { signOutAction } from '@/app/(account)/sign-out/actions'
import { ButtonLink } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { PageFrame } from '@/components/ui/page-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getAccount } from '@/lib/services/own-account'
import { listMyRinks } from '@/lib/services/rinks'
import { AccountForm } from './_components/account-form'
import { dayOf } from './_components/dates'
import { Section } from './_components/section'

export const metadata: Metadata = { title: 'Your account' }

const PLACES = [
  { path: 'devices', word: 'Devices and mail', says: 'Where alerts go, and a test of each' },
  { path: 'security', word: 'Address, password, sign-ins', says: 'And sign out everywhere' },
  { path: 'data', word: 'Your data', says: 'Take everything along, or delete the account' },
]

export default async function AccountPage() {
  const context = await pageContext()
  const { email, name, units, clock, theme, deletionDueAt } = await orNotFound(getAccount(context))
  const rinks = await listMyRinks(context)
  return (
    <PageFrame>
      <div className="max-w-[34rem]">
        <h1 className="mb-2 text-verdict font-medium tracking-tight">Your account</h1>
        <p className="mb-6 break-words text-graphite">{email}</p>
        {deletionDueAt ? (
          <Notice tone="caution">
            This account will be deleted on {dayOf(deletionDueAt)}.{' '}
            <Link href={'/account/keep' as Route} className="inline-flex min-h-touch items-center underline">
              Keep it
            </Link>
          </Notice>
        ) : null}
        <ul className="mb-8 list-none border-t border-rule p-0">
          {PLACES.map(({ path, word, says }) => (
            <li key={path} className="border-b border-rule">
              <Link href={`/account/${path}` as Route} className="grid min-h-touch py-3 no-underline">
                <span className="font-medium">{word}</span>
                <span className="text-note text-graphite">{says}</span>
              </Link>
            </li>
          ))}
          {context.viewer.isAdmin ? (
            <li className="border-b border-rule">
              <Link href={'/admin' as Route} className="grid min-h-touch py-3 no-underline">
                <span className="font-medium">How this server does</span>
                <span className="text-note text-graphite">For its admin</span>
              </Link>
            </li>
          ) : null}
        </ul>
        <AccountForm name={name} units={units} clock={clock} theme={theme} />
        <Section title="Rinks">
          <ul className="mb-4 list-none p-0">
            {rinks.map((rink) => (
              <li key={rink.id} className="flex flex-wrap items-center justify-between gap-x-4 border-b border-rule">
                <Link href={`/rinks/${rink.id}` as Route} className="inline-flex min-h-touch items-center">
                  {rink.name}
                </Link>
                <Link
                  href={`/rinks/${rink.id}/leave` as Route}
                  className="inline-flex min-h-touch items-center text-note text-graphite underline"
                >
                  Leave<span className="sr-only"> {rink.name}</span>
                </Link>
              </li>
            ))}
          </ul>
          <ButtonLink href={'/rinks/new' as Route}>
            {rinks.length > 0 ? 'Set up another rink' : 'Set up a rink'}
          </ButtonLink>
        </Section>
        <Section title="This device">
          <SignOutForm action={signOutAction} submit="Sign out" />
        </Section>
      </div>
    </PageFrame>
  )
}
