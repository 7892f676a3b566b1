// Where a mailed reset link leads.
import type { Metadata } from 'next'
import { openContext } from '@/lib/auth/open-context'
import { findLinkOwner } from '@/lib/services/accounts'
import { DeadLink } from '../../_components/dead-link'
import { Title } from '../../_components/title'
import { NewPasswordForm } from './_components/new-password-form'

export const metadata: Metadata = { title: 'Choose a new password' }

export default async function NewPasswordPage({ searchParams }: PageProps<'/reset/new'>) {
  const key = String((await searchParams).key)
  const owner = await findLinkOwner(await openContext(), 'reset', key)
  if (!owner) return <DeadLink href="/reset" again="Get a new link" />
  return (
    <>
      <Title lead={`For ${owner.email}.`}>Choose a new password</Title>
      <NewPasswordForm linkKey={key} email={owner.email} />
    </>
  )
}
