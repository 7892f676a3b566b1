// Sign-in: by password, or by a link in a mail.
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { redirect } from 'next/navigation'
import { Notice } from '@/components/ui/notice'
import { localPath, withNext } from '@/lib/auth/next-path'
import { maybeViewer } from '@/lib/auth/request-context'
import { SIGN_IN_REFUSED } from '@/lib/services/accounts'
import { Title } from '../_components/title'
import { SignInForm } from './_components/sign-in-form'

export const metadata: Metadata = { title: 'Sign in' }

export default async function SignInPage({ searchParams }: PageProps<'/sign-in'>) {
  const { next: asked, error } = await searchParams
  const next = localPath(asked)
  if (await maybeViewer()) redirect((next ?? '/rinks') as Route)
  return (
    <>
      <Title>Sign in</Title>
      {error ? <Notice tone="caution">{SIGN_IN_REFUSED}</Notice> : null}
      <SignInForm next={next} />
      <p className="mt-4 text-note">
        <Link href="/reset" className="inline-flex min-h-touch items-center underline">
          I forgot my password
        </Link>
      </p>
      <p className="mt-4 border-t border-rule pt-4 text-note text-graphite">
        No account yet?{' '}
        <Link href={withNext('/sign-up', next)} className="inline-flex min-h-touch items-center text-ink underline">
          Sign up
        </Link>
      </p>
    </>
  )
}
