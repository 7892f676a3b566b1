// Where a member lands who opened a page of the keeper's: who may, and who they are.
import type { Metadata, Route } from 'next'
import { RinkFrame } from '@/components/rinks/rink-frame'
import { ButtonLink } from '@/components/ui/button'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getWhoMay } from '@/lib/services/my-rinks'

export const metadata: Metadata = { title: 'Not with your role' }

export default async function WhoMayPage({ params }: PageProps<'/rinks/[rinkId]/who-may'>) {
  const { rinkId } = await params
  const { rinkName, keepers } = await orNotFound(getWhoMay(await pageContext(), rinkId))
  return (
    <RinkFrame name={rinkName} about="Not with your role">
      <h1 className="mb-3 text-verdict font-medium">That page is not for your role on this rink.</h1>
      <p className="mb-5 max-w-line">
        {keepers.length === 1 ? 'Its keeper is' : 'Its keepers are'} {keepers.join(', ')}: ask there.
      </p>
      <ButtonLink href={`/rinks/${rinkId}` as Route}>Back to tonight</ButtonLink>
    </RinkFrame>
  )
}
