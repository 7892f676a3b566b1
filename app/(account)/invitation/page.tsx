// Where the link in an invitation leads. Looking at it changes nothing.
import type { Metadata, Route } from 'next'
import { ButtonLink } from '@/components/ui/button'
import { openContext } from '@/lib/auth/open-context'
import { maybeViewer } from '@/lib/auth/request-context'
import { readInvitation } from '@/lib/services/joining'
import { AS_ROLE } from '@/lib/words/roles'
import { Title } from '../_components/title'
import { OpenInvitation } from './_components/open-invitation'

export const metadata: Metadata = { title: 'Invitation' }

export default async function InvitationPage({ searchParams }: PageProps<'/invitation'>) {
  const key = String((await searchParams).key)
  const invitation = await readInvitation(await openContext(), await maybeViewer(), key)
  if (invitation.state === 'closed') {
    return (
      <>
        <Title lead="If you still want to join, ask whoever invited you for a new one.">{invitation.sentence}</Title>
        <ButtonLink href="/">To the front page</ButtonLink>
      </>
    )
  }
  if (invitation.state === 'joined') {
    return (
      <>
        <Title lead={`You are on it ${AS_ROLE[invitation.role]}.`}>{invitation.rinkName}</Title>
        <ButtonLink href={`/rinks/${invitation.rinkId}` as Route} look="main">
          See tonight
        </ButtonLink>
      </>
    )
  }
  return <OpenInvitation {...invitation} linkKey={key} />
}
