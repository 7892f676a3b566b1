// Alerts: when and how one is told about this rink, silence, devices, and what one was told.
import type { Metadata } from 'next'
import type { ReactNode } from 'react'
import { pushSetup } from '@/app/(member)/_components/push-setup'
import { DeviceSwitch } from '@/components/alerts/device-switch'
import { RinkFrame } from '@/components/rinks/rink-frame'
import { Notice } from '@/components/ui/notice'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getAlertSettings } from '@/lib/services/alert-preferences'
import { standingText } from './_components/alert-words'
import { DeviceList } from './_components/device-list'
import { MuteForm } from './_components/mute-form'
import { PreferencesForm } from './_components/preferences-form'
import { ToldList } from './_components/told-list'
import { ToldOf } from './_components/told-of'

export const metadata: Metadata = { title: 'Alerts' }

export default async function AlertsPage({ params }: PageProps<'/rinks/[rinkId]/alerts'>) {
  const { rinkId } = await params
  const settings = await orNotFound(getAlertSettings(await pageContext(), rinkId))
  const { rink, preferences, tonightDate, email, devices } = settings
  return (
    <RinkFrame name={rink.name} about="Alerts">
      <h1 className="mb-6 max-w-[26ch] text-verdict font-medium lg:text-verdict-wide">{standingText(settings)}</h1>
      <div className="gap-x-14 lg:grid lg:grid-cols-2">
        <div className="max-w-[34rem]">
          <Section title="Silence">
            <MuteForm rinkId={rinkId} tonightDate={tonightDate} mutedThroughDate={preferences.mutedThroughDate} />
          </Section>
          <Section title="When and how">
            {settings.isEmailRefused ? (
              <Notice tone="caution">
                Mail to {email} came back, so we send none. Once your mailbox works, sign out and sign in by mailed
                link: that takes it back into use.
              </Notice>
            ) : null}
            <PreferencesForm
              rinkId={rinkId}
              email={email}
              timeZone={rink.timeZone}
              tellAt={preferences.tellAt}
              wantsEmail={preferences.wantsEmail}
              wantsPush={preferences.wantsPush}
            />
          </Section>
          <Section title="This device">
            <DeviceSwitch {...pushSetup(devices)} />
          </Section>
          <Section title="Your devices">
            <DeviceList rinkId={rinkId} timeZone={rink.timeZone} devices={devices} />
          </Section>
        </div>
        <div>
          <Section title="What you are told of">
            <ToldOf phase={rink.phase} />
          </Section>
          <Section title="What you were told">
            <ToldList settings={settings} />
          </Section>
        </div>
      </div>
    </RinkFrame>
  )
}

function Section({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="mb-8">
      <h2 className="mb-3 border-b border-rule pb-2 font-semibold">{title}</h2>
      {children}
    </section>
  )
}
