// Where the link in the first mail leads.
import type { Metadata } from 'next'
import { openContext } from '@/lib/auth/open-context'
import { findLinkOwner } from '@/lib/services/accounts'
import { readSignedUpAddress } from '../mailed-address'
import { DeadLink } from '../_components/dead-link'
import { KeyForm } from '../_components/key-form'
import { Title } from '../_components/title'
import { confirmAddressAction } from './actions'

export const metadata: Metadata = { title: 'Confirm your address' }

export default async function VerifyPage({ searchParams }: PageProps<'/verify'>) {
  const key = String((await searchParams).key)
  const owner = await findLinkOwner(await openContext(), 'verify', key)
  if (!owner) return <DeadLink href="/sign-in" again="Sign in, or get a new link" />
  const isHere = (await readSignedUpAddress()) === owner.email
  return (
    <>
      <Title lead={`${owner.email} is where your alerts will go.`}>Confirm your address</Title>
      <KeyForm action={confirmAddressAction} linkKey={key} submit="Confirm and sign in" />
      <p className="mt-6 text-note text-graphite">
        If you did not sign up yourself, close this page.
        {isHere
          ? null
          : ' You signed up in another browser, so the password that was typed there is dropped: set one under your account, or sign in by mailed link.'}
      </p>
    </>
  )
}
