// What stands between the page and the newest forecast, and what to do.
import { ageText } from '@/components/rinks/reader'
import { Notice } from '@/components/ui/notice'
import type { WeekView } from '@/lib/schemas/week-view'

export function WeekNotices({ view }: { view: WeekView }) {
  const { forecast, lastReadFailed } = view
  if (forecast?.isStale) {
    return (
      <Notice tone="caution">
        <p>
          This forecast was read {ageText(forecast.fetchedAt, Date.parse(view.readAt))} and no newer one could be had.
          We ask again every hour. Until one comes, take no night below for settled.
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
