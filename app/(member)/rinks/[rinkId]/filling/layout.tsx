// The frame of the Filling page. It asks for the rink before anything is sent, so that strangers get a true 404.
import { RinkFrame } from '@/components/rinks/rink-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getMyRink } from '@/lib/services/my-rinks'

export default async function FillingLayout({ params, children }: LayoutProps<'/rinks/[rinkId]/filling'>) {
  const rink = await orNotFound(getMyRink(await pageContext(), (await params).rinkId))
  return (
    <RinkFrame name={rink.name} about="Filling">
      {children}
    </RinkFrame>
  )
}
