// The last step of set-up: may this device show notifications? Then on to Tonight.
import type { Metadata, Route } from 'next'
import { pushSetup } from '@/app/(member)/_components/push-setup'
import { ButtonLink } from '@/components/ui/button'
import { PageFrame } from '@/components/ui/page-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getAlertSettings } from '@/lib/services/alert-preferences'
import { timeOfDayText } from '../_components/alert-words'
import { FirstDevice } from './first-device'

export const metadata: Metadata = { title: 'This device' }

export default async function ThisDevicePage({ params }: PageProps<'/rinks/[rinkId]/alerts/this-device'>) {
  const { rinkId } = await params
  const { rink, preferences, devices, clock } = await orNotFound(getAlertSettings(await pageContext(), rinkId))
  const time = timeOfDayText(preferences.tellAt, clock)
  return (
    <PageFrame>
      <div className="max-w-line">
        <h1 className="mb-3 text-verdict font-medium lg:text-verdict-wide">{rink.name} is set up.</h1>
        <p className="mb-5">
          Shall this device tell you at {time} when the night ahead is good? Your browser will ask once whether
          Nightsheet may show notifications.
        </p>
        <FirstDevice rinkId={rinkId} {...pushSetup(devices)} />
        <p className="mt-5">
          <ButtonLink href={`/rinks/${rinkId}` as Route}>Go to Tonight</ButtonLink>
        </p>
      </div>
    </PageFrame>
  )
}
