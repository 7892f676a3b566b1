// What the reader has to know about the sheet as a whole: an old forecast, another zone.
'use client'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { ForecastNotice } from '@/components/rinks/forecast-notice'
import { zoneOffsetMinutes } from '@/lib/advice/zoned-time'
import type { TonightView } from '@/lib/schemas/tonight-view'

export function StatusNotices({ view, now }: { view: TonightView; now: number }) {
  return <ForecastNotice forecast={view.forecast} lastReadFailed={view.lastReadFailed} now={now} />
}

/** Names the rink's zone when the reader's clock shows something else; only the browser knows that, so its line is kept free. */
export function ZoneNote({ view }: { view: TonightView }) {
  const isHydrated = useHydrated()
  return <p className="mb-2 min-h-8 pt-2 text-small leading-6 text-graphite">{isHydrated ? zoneText(view) : null}</p>
}

/** On the night that one of the two clocks changes they differ at one end of it only. */
export function zoneText({ night, rink }: TonightView): string | null {
  const at = Date.parse(night.startsAt)
  const isSame = (millis: number) => -new Date(millis).getTimezoneOffset() === zoneOffsetMinutes(millis, rink.timeZone)
  if (isSame(at) && isSame(Date.parse(night.endsAt))) return null
  const parts = new Intl.DateTimeFormat('en', { timeZone: rink.timeZone, timeZoneName: 'long' }).formatToParts(at)
  return `All times are the rink’s: ${parts.find((part) => part.type === 'timeZoneName')?.value ?? rink.timeZone}.`
}
