// What stands between the page and the newest state: no network, an old forecast, a silence, another zone. And what to do.
'use client'
import Link from 'next/link'
import type { ReactNode } from 'react'
import { ageText, readerOf } from '@/components/rinks/reader'
import { clockText } from '@/lib/words/times'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { Button } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import { zoneOffsetMinutes } from '@/lib/advice/zoned-time'
import type { TonightView } from '@/lib/schemas/tonight-view'
import type { ReadTrouble } from './use-tonight'

interface StatusProps {
  view: TonightView
  now: number
  trouble: ReadTrouble
  onReadAgain: () => void
}

export function StatusNotices({ view, now, trouble, onReadAgain }: StatusProps) {
  const reader = readerOf(view)
  const asOf = `As of ${clockText(view.readAt, reader)}, ${ageText(view.readAt, now)}.`
  return (
    <>
      {trouble ? (
        <Notice tone="caution" live>
          <TroubleText trouble={trouble} asOf={asOf} onReadAgain={onReadAgain} />
        </Notice>
      ) : null}
      {view.forecast?.isStale ? (
        <Notice tone="caution">
          <p>
            This forecast was read {ageText(view.forecast.fetchedAt, now)}, and a newer one could not be had since. We
            ask again every hour and judge the night anew as soon as one comes. Until then trust your own thermometer
            and sky more than this page.
          </p>
        </Notice>
      ) : view.lastReadFailed && view.outlook ? (
        <Notice>
          <p>The last try to read a newer forecast failed. This one still holds; we try again within the hour.</p>
        </Notice>
      ) : null}
    </>
  )
}

function TroubleText({
  trouble,
  asOf,
  onReadAgain,
}: {
  trouble: NonNullable<ReadTrouble>
  asOf: string
  onReadAgain: () => void
}): ReactNode {
  if (trouble === 'signed-out') {
    return (
      <p>
        {asOf} You are signed out on this device.{' '}
        <Link href="/sign-in" className="underline">
          Sign in
        </Link>{' '}
        to see the newest state.
      </p>
    )
  }
  if (trouble === 'gone') return <p>{asOf} You are no longer on this rink’s list, or the rink was removed.</p>
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
      <p>
        {trouble === 'offline'
          ? `${asOf} No connection: this is the last state this device has. It is read again once you are back.`
          : `${asOf} The newest state could not be read; we keep trying.`}
      </p>
      <Button onClick={onReadAgain}>Read again</Button>
    </div>
  )
}

/** Names the rink's zone when the reader's clock shows something else; only the browser knows that. */
export function ZoneNote({ view }: { view: TonightView }) {
  const isHydrated = useHydrated()
  const at = Date.parse(view.night.startsAt)
  if (!isHydrated || -new Date(at).getTimezoneOffset() === zoneOffsetMinutes(at, view.rink.timeZone)) return null
  const parts = new Intl.DateTimeFormat('en', { timeZone: view.rink.timeZone, timeZoneName: 'long' }).formatToParts(at)
  const zone = parts.find((part) => part.type === 'timeZoneName')?.value ?? view.rink.timeZone
  return <p className="mt-2 text-small text-graphite">All times are the rink’s: {zone}.</p>
}
