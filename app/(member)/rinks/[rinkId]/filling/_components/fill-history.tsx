// What was done at this fill: times of running hose, and looks.
import type { OpenFillView } from '@/lib/schemas/filling-view'
import type { WordOptions } from '@/lib/words/options'
import { iceText, waterText } from '@/lib/words/quantities'
import { clockText, weekdayText } from '@/lib/words/times'

interface Props {
  fill: OpenFillView
  reader: WordOptions
  now: string
}

const ROW = 'grid grid-cols-[8.75rem_1fr] gap-x-3 border-b border-rule py-2'

export function FillHistory({ fill: { sessions, checks, startedBy }, reader, now }: Props) {
  return (
    <section className="mt-8">
      <h2 className="mb-2 font-semibold">So far</h2>
      <ul className="list-none border-t border-rule p-0">
        {checks.map(({ at, by, lowCornerDepthMm, note }) => (
          <li key={at} className={ROW}>
            <time dateTime={at} className="text-note text-graphite">
              {momentText(at, now, reader)}
            </time>
            <span>
              {by ?? 'Somebody'} looked
              {lowCornerDepthMm === null ? '' : `: ${iceText(lowCornerDepthMm, reader)} at the low corner`}
              {note ? <span className="block text-note whitespace-pre-line text-graphite">{note}</span> : null}
            </span>
          </li>
        ))}
        {[...sessions].reverse().map(({ startedAt, stoppedAt, litres }, index) => (
          <li key={startedAt} className={ROW}>
            <time dateTime={startedAt} className="text-note text-graphite">
              {momentText(startedAt, now, reader)}
            </time>
            <span>
              {stoppedAt ? `Hose ran until ${momentText(stoppedAt, now, reader)}` : 'Hose running'}:{' '}
              {waterText(litres, reader)}
              {index === sessions.length - 1 && startedBy ? (
                <span className="block text-note text-graphite">Started by {startedBy}</span>
              ) : null}
            </span>
          </li>
        ))}
      </ul>
    </section>
  )
}

const DAY_MILLIS = 86_400_000

/** With its weekday once it is not within the day any more. */
function momentText(at: string, now: string, reader: WordOptions): string {
  const isRecent = Date.parse(now) - Date.parse(at) < DAY_MILLIS / 2
  return isRecent ? clockText(at, reader) : `${weekdayText(at, reader).slice(0, 3)} ${clockText(at, reader)}`
}
