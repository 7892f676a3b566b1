// Says that the forecast behind a page is old, or that the last try to read a newer one failed.
import { ageText } from '@/components/rinks/reader'
import { Notice } from '@/components/ui/notice'
import type { TonightView } from '@/lib/schemas/tonight-view'

export function ForecastNotice({
  forecast,
  lastReadFailed,
  now,
}: Pick<TonightView, 'forecast' | 'lastReadFailed'> & { now: number }) {
  if (forecast?.isStale) {
    return (
      <Notice tone="caution">
        <p>
          This forecast was read {ageText(forecast.fetchedAt, now)}, and a newer one could not be had since. We ask
          again every hour and judge the night anew as soon as one comes. Until then trust your own thermometer and sky
          more than this page.
        </p>
      </Notice>
    )
  }
  if (!lastReadFailed || !forecast) return null
  return (
    <Notice>
      <p>The last try to read a newer forecast failed. This one still holds; we try again within the hour.</p>
    </Notice>
  )
}
