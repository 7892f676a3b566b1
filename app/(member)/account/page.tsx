// One's own account.
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import type { ReactNode } from 'react'
import { SignOutForm } from '@/app/(account)/_components/sign-out-form'
import { signOutAction, signOutEverywhereAction } from '@/app/(account)/sign-out/actions'
import { ButtonLink } from '@/components/ui/button'
import { PageFrame } from '@/components/ui/page-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getAccount } from '@/lib/services/own-account'
import { listMyRinks } from '@/lib/services/rinks'
import { AccountForm } from './_components/account-form'
import { PasswordChangeForm } from './_components/password-change-form'

export const metadata: Metadata = { title: 'Your account' }

export default async function AccountPage() {
  const context = await pageContext()
  const { email, name, units, clock, theme, hasPassword } = await orNotFound(getAccount(context))
  const rinks = await listMyRinks(context)
  return (
    <PageFrame>
      <div className="max-w-[30rem]">
        <h1 className="mb-2 text-verdict font-medium tracking-tight">Your account</h1>
        <p className="mb-6 break-words text-graphite">{email}</p>
        <AccountForm name={name} units={units} clock={clock} theme={theme} />
        <Section title="Rinks">
          <ul className="mb-4 list-none p-0">
            {rinks.map((rink) => (
              <li key={rink.id}>
                <Link href={`/rinks/${rink.id}` as Route} className="inline-flex min-h-touch items-center">
                  {rink.name}
                </Link>
              </li>
            ))}
          </ul>
          <ButtonLink href={'/rinks/new' as Route}>
            {rinks.length > 0 ? 'Set up another rink' : 'Set up a rink'}
          </ButtonLink>
        </Section>
        {context.viewer.isAdmin ? (
          <Section title="For the admin">
            <Link href={'/admin' as Route} className="inline-flex min-h-touch items-center">
              How this server does
            </Link>
          </Section>
        ) : null}
        <Section title="Password">
          <PasswordChangeForm email={email} hasPassword={hasPassword} />
        </Section>
        <Section title="This device and others">
          <div className="flex flex-wrap gap-3">
            <SignOutForm action={signOutAction} submit="Sign out" />
            <SignOutForm action={signOutEverywhereAction} submit="Sign out everywhere" />
          </div>
        </Section>
      </div>
    </PageFrame>
  )
}

function Section({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="mt-8 border-t border-rule pt-6">
      <h2 className="mb-3 font-semibold">{title}</h2>
      {children}
    </section>
  )
}
