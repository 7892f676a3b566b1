// Where the link in the mail to a new address leads.
import type { Metadata } from 'next'
import { openContext } from '@/lib/auth/open-context'
import { findLinkOwner } from '@/lib/services/accounts'
import { DeadLink } from '../_components/dead-link'
import { KeyForm } from '../_components/key-form'
import { Title } from '../_components/title'
import { takeNewAddressAction } from './actions'

export const metadata: Metadata = { title: 'Confirm your new address' }

export default async function ChangeEmailPage({ searchParams }: PageProps<'/change-email'>) {
  const key = String((await searchParams).key)
  const owner = await findLinkOwner(await openContext(), 'change-email', key)
  if (!owner) return <DeadLink href="/sign-in" again="Sign in, and ask again" />
  return (
    <>
      <Title lead={`From now on alerts go to ${owner.email}, and you sign in with it.`}>Use this address</Title>
      <KeyForm action={takeNewAddressAction} linkKey={key} submit="Use this address" />
    </>
  )
}
