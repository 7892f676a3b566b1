// The frame of the Freezing page. It asks for the rink before anything is sent, so that strangers get a true 404.
import { RinkFrame } from '@/components/rinks/rink-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getMyRink } from '@/lib/services/my-rinks'

export default async function FreezingLayout({ params, children }: LayoutProps<'/rinks/[rinkId]/freezing'>) {
  const rink = await orNotFound(getMyRink(await pageContext(), (await params).rinkId))
  return (
    // On paper there is the sign and nothing else.
    <div className="print:[&_header]:hidden">
      <RinkFrame name={rink.name} about="Freezing">
        {children}
      </RinkFrame>
    </div>
  )
}
