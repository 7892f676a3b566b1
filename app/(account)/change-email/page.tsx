// Where the link in the mail to a new address leads. It signs nobody in: the address may be mistyped, its reader a stranger.
import type { Metadata } from 'next'
import { ButtonLink } from '@/components/ui/button'
import { withNext } from '@/lib/auth/next-path'
import { openContext } from '@/lib/auth/open-context'
import { maybeViewer } from '@/lib/auth/request-context'
import { readNewAddress } from '@/lib/services/new-address'
import { DeadLink } from '../_components/dead-link'
import { KeyForm } from '../_components/key-form'
import { Title } from '../_components/title'
import { takeNewAddressAction } from './actions'

export const metadata: Metadata = { title: 'Confirm your new address' }

export default async function ChangeEmailPage({ searchParams }: PageProps<'/change-email'>) {
  const key = String((await searchParams).key)
  const view = await readNewAddress(await openContext(), await maybeViewer(), key)
  if (view.state === 'dead') return <DeadLink href="/sign-in" again="Sign in, and ask again" />
  if (view.state === 'stranger') return <SignInFirst linkKey={key} />
  if (view.state === 'another-account') return <AnotherAccount />
  return (
    <>
      <Title lead={`From now on alerts go to ${view.email} instead of ${view.presentEmail}, and you sign in with it.`}>
        Use this address
      </Title>
      <KeyForm action={takeNewAddressAction} linkKey={key} submit="Use this address" />
    </>
  )
}

function SignInFirst({ linkKey }: { linkKey: string }) {
  return (
    <>
      <Title lead="Open the link in the browser where you asked for the new address. Or sign in here, the way you did until now: you come back to this page.">
        Sign in first
      </Title>
      <ButtonLink href={withNext('/sign-in', `/change-email?key=${linkKey}`)} look="main">
        Sign in
      </ButtonLink>
      <p className="mt-6 text-note text-graphite">
        If you did not ask for this, somebody mistyped their address. Close this page, and nothing changes.
      </p>
    </>
  )
}

function AnotherAccount() {
  return (
    <>
      <Title lead="You are signed in with another account than the one that asked for this address. Sign out, and open the link in the mail again.">
        Not this account
      </Title>
      <ButtonLink href="/sign-out" look="main">
        Sign out
      </ButtonLink>
    </>
  )
}
