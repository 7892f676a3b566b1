// Sign-up.
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { redirect } from 'next/navigation'
import { localPath, withNext } from '@/lib/auth/next-path'
import { maybeViewer } from '@/lib/auth/request-context'
import { Title } from '../_components/title'
import { SignUpForm } from './_components/sign-up-form'

export const metadata: Metadata = { title: 'Sign up' }

export default async function SignUpPage({ searchParams }: PageProps<'/sign-up'>) {
  const next = localPath((await searchParams).next)
  if (await maybeViewer()) redirect((next ?? '/rinks') as Route)
  return (
    <>
      <Title lead={next ? undefined : 'Then set up your rink: it takes about three minutes.'}>Sign up</Title>
      <SignUpForm next={next} />
      <p className="mt-8 border-t border-rule pt-4 text-note text-graphite">
        Signed up before?{' '}
        <Link href={withNext('/sign-in', next)} className="inline-flex min-h-touch items-center text-ink underline">
          Sign in
        </Link>
      </p>
    </>
  )
}
