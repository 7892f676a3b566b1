// Sign-up.
import type { Metadata } from 'next'
import Link from 'next/link'
import { redirect } from 'next/navigation'
import { maybeViewer } from '@/lib/auth/request-context'
import { Title } from '../_components/title'
import { SignUpForm } from './_components/sign-up-form'

export const metadata: Metadata = { title: 'Sign up' }

export default async function SignUpPage() {
  if (await maybeViewer()) redirect('/rinks')
  return (
    <>
      <Title lead="Then set up your rink: it takes about three minutes.">Sign up</Title>
      <SignUpForm />
      <p className="mt-8 border-t border-rule pt-4 text-note text-graphite">
        Signed up before?{' '}
        <Link href="/sign-in" className="inline-flex min-h-touch items-center text-ink underline">
          Sign in
        </Link>
      </p>
    </>
  )
}
