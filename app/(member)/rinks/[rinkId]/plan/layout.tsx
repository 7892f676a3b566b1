// The frame of the building plan. It asks for the rink before anything is sent, so that strangers get a true 404.
import { RinkFrame } from '@/components/rinks/rink-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getMyRink } from '@/lib/services/my-rinks'

export default async function PlanLayout({ params, children }: LayoutProps<'/rinks/[rinkId]/plan'>) {
  const rink = await orNotFound(getMyRink(await pageContext(), (await params).rinkId))
  return (
    <RinkFrame name={rink.name} about="Plan the build">
      {children}
    </RinkFrame>
  )
}
