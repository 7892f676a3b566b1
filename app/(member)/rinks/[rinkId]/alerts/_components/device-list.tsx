// One's devices, with what is wrong with them and a way to take each off.
import { formatInTimeZone } from 'date-fns-tz'
import { browserName } from '@/components/alerts/words'
import { TestButton } from '@/components/alerts/test-button'
import type { Device } from '@/lib/services/push-subscriptions'
import { RemoveDevice } from './remove-device'

export function DeviceList({ rinkId, timeZone, devices }: { rinkId: string; timeZone: string; devices: Device[] }) {
  if (devices.length === 0) return <p className="text-graphite">No device is told yet.</p>
  return (
    <ul>
      {devices.map(({ id, pushHost, addedAt, disabledReason }) => (
        <li key={id} className="grid grid-cols-[1fr_auto] items-center gap-4 border-b border-rule py-2 first:pt-0">
          <div>
            {browserName(pushHost)}
            <span className="block text-note text-graphite">
              since {formatInTimeZone(addedAt, timeZone, 'd MMMM yyyy')}
            </span>
            {disabledReason === null ? null : (
              <span className="block text-note text-rust">
                Not told any more: its push service refused ({disabledReason}). Switch it on again on that device, or
                take it off.
              </span>
            )}
          </div>
          <RemoveDevice rinkId={rinkId} deviceId={id} name={browserName(pushHost)} />
          {disabledReason === null ? <TestButton deviceId={id} to={browserName(pushHost)} /> : null}
        </li>
      ))}
    </ul>
  )
}
