// What one was told about this rink, newest first.
import { fateText, kindText } from '@/components/alerts/words'
import { dayText } from '@/components/rinks/reader'
import { localDateOf } from '@/lib/advice/zoned-time'
import type { AlertSettings } from '@/lib/services/alert-preferences'
import { wordsFor } from '@/lib/words/options'
import { clockText } from '@/lib/words/times'

export function ToldList({ settings: { told, rink, units, clock } }: { settings: AlertSettings }) {
  if (told.length === 0) {
    return <p className="text-graphite">Nothing yet.</p>
  }
  const words = wordsFor({ units, clock }, rink.timeZone)
  return (
    <ul>
      {told.map((message) => {
        const at = message.settledAt ?? message.createdAt
        const date = localDateOf(at.getTime(), rink.timeZone)
        return (
          <li key={message.id} className="grid grid-cols-[8.75rem_1fr] gap-x-3 border-b border-rule py-2 first:pt-0">
            <time dateTime={at.toISOString()} className="text-note text-graphite">
              {dayText(date)}
              <span className="block">{clockText(at, words)}</span>
            </time>
            <div>
              {kindText(message)}
              <span className="block text-note text-graphite">
                {fateText(message)}
                {message.nightDate && message.nightDate !== date ? `; night of ${dayText(message.nightDate)}` : null}
              </span>
            </div>
          </li>
        )
      })}
    </ul>
  )
}
