// What the reader has to know about the sheet as a whole: an old forecast, another zone.
'use client'
import { ageText } from '@/components/rinks/reader'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { Notice } from '@/components/ui/notice'
import { zoneOffsetMinutes } from '@/lib/advice/zoned-time'
import type { TonightView } from '@/lib/schemas/tonight-view'

export function StatusNotices({ view, now }: { view: TonightView; now: number }) {
  if (view.forecast?.isStale) {
    return (
      <Notice tone="caution">
        <p>
          This forecast was read {ageText(view.forecast.fetchedAt, now)}, and a newer one could not be had since. We ask
          again every hour and judge the night anew as soon as one comes. Until then trust your own thermometer and sky
          more than this page.
        </p>
      </Notice>
    )
  }
  if (!view.lastReadFailed || !view.outlook) return null
  return (
    <Notice>
      <p>The last try to read a newer forecast failed. This one still holds; we try again within the hour.</p>
    </Notice>
  )
}

/** Names the rink's zone when the reader's clock shows something else; only the browser knows that, so its line is kept free. */
export function ZoneNote({ view }: { view: TonightView }) {
  const isHydrated = useHydrated()
  return <p className="mb-2 min-h-8 pt-2 text-small leading-6 text-graphite">{isHydrated ? zoneText(view) : null}</p>
}

function zoneText({ night, rink }: TonightView): string | null {
  const at = Date.parse(night.startsAt)
  if (-new Date(at).getTimezoneOffset() === zoneOffsetMinutes(at, rink.timeZone)) return null
  const parts = new Intl.DateTimeFormat('en', { timeZone: rink.timeZone, timeZoneName: 'long' }).formatToParts(at)
  return `All times are the rink’s: ${parts.find((part) => part.type === 'timeZoneName')?.value ?? rink.timeZone}.`
}
