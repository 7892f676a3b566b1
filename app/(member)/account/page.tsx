// One's own account.
import type { Metadata } from 'next'
import type { ReactNode } from 'react'
import { SignOutForm } from '@/app/(account)/_components/sign-out-form'
import { signOutAction, signOutEverywhereAction } from '@/app/(account)/sign-out/actions'
import { PageFrame } from '@/components/ui/page-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getAccount } from '@/lib/services/own-account'
import { AccountForm } from './_components/account-form'
import { PasswordChangeForm } from './_components/password-change-form'

export const metadata: Metadata = { title: 'Your account' }

export default async function AccountPage() {
  const { email, name, units, clock, hasPassword } = await orNotFound(getAccount(await pageContext()))
  return (
    <PageFrame>
      <div className="max-w-[30rem]">
        <h1 className="mb-2 text-verdict font-medium tracking-tight">Your account</h1>
        <p className="mb-6 break-words text-graphite">{email}</p>
        <AccountForm name={name} units={units} clock={clock} />
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
