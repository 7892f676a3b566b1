// Where a mailed sign-in link leads.
import type { Metadata } from 'next'
import { openContext } from '@/lib/auth/open-context'
import { findLinkOwner } from '@/lib/services/accounts'
import { DeadLink } from '../../_components/dead-link'
import { KeyForm } from '../../_components/key-form'
import { Title } from '../../_components/title'
import { signInWithLinkAction } from './actions'

export const metadata: Metadata = { title: 'Sign in' }

export default async function SignInLinkPage({ searchParams }: PageProps<'/sign-in/link'>) {
  const key = String((await searchParams).key)
  const owner = await findLinkOwner(await openContext(), 'sign-in', key)
  if (!owner) return <DeadLink href="/sign-in" again="Get a new link" />
  return (
    <>
      <Title lead={`As ${owner.email}, on this device.`}>Sign in</Title>
      <KeyForm action={signInWithLinkAction} linkKey={key} submit="Sign in" />
    </>
  )
}
