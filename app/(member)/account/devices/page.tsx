// Where alerts go: every device and the mailbox, each with a test.
import type { Metadata } from 'next'
import { pushSetup } from '@/app/(member)/_components/push-setup'
import { browserName } from '@/components/alerts/words'
import { DeviceSwitch } from '@/components/alerts/device-switch'
import { TestButton } from '@/components/alerts/test-button'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getAccount } from '@/lib/services/own-account'
import { listOwnDevices } from '@/lib/services/push-subscriptions'
import { AccountFrame } from '../_components/account-frame'
import { dayOf } from '../_components/dates'
import { RemoveDevice } from '../_components/remove-device'
import { Section } from '../_components/section'

export const metadata: Metadata = { title: 'Devices and mail' }

export default async function DevicesPage() {
  const context = await pageContext()
  const { email, isEmailRefused } = await orNotFound(getAccount(context))
  const devices = await listOwnDevices(context)
  return (
    <AccountFrame title="Devices and mail">
      <Section title="This device">
        <DeviceSwitch {...pushSetup(devices)} />
      </Section>
      <Section title="Your devices">
        {devices.length === 0 ? <p className="text-graphite">No device is told yet.</p> : null}
        <ul className="list-none p-0">
          {devices.map(({ id, pushHost, addedAt, disabledReason }) => (
            <li key={id} className="border-b border-rule py-3 first:pt-0">
              <p>
                {browserName(pushHost)}
                <span className="block text-note text-graphite">since {dayOf(addedAt)}</span>
                {disabledReason === null ? null : (
                  <span className="block text-note text-rust">
                    Not told any more: its push service refused ({disabledReason}). Switch it on again on that device.
                  </span>
                )}
              </p>
              <div className="mt-2 flex flex-wrap items-start gap-3">
                {disabledReason === null ? <TestButton deviceId={id} to={browserName(pushHost)} /> : null}
                <RemoveDevice deviceId={id} name={browserName(pushHost)} />
              </div>
            </li>
          ))}
        </ul>
      </Section>
      <Section title="E-mail">
        <p className="mb-3 break-words">
          {email}
          {isEmailRefused ? (
            <span className="block text-note text-rust">
              Mail to it came back, so we send none. Once the mailbox works, sign in by mailed link.
            </span>
          ) : null}
        </p>
        <TestButton to="your mailbox" />
      </Section>
    </AccountFrame>
  )
}
