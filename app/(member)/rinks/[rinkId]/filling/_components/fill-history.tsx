// What was done at this fill: times of running hose, and looks.
import { DAY_MILLIS } from '@/lib/physics/constants'
import type { FillLook, OpenFillView } from '@/lib/schemas/filling-view'
import type { WordOptions } from '@/lib/words/options'
import { iceText, waterText } from '@/lib/words/quantities'
import { clockText, weekdayText } from '@/lib/words/times'

interface Props {
  fill: OpenFillView
  reader: WordOptions
  now: string
}

const ROW = 'grid grid-cols-[8.75rem_1fr] gap-x-3 border-b border-rule py-2'

export function FillHistory({ fill, reader, now }: Props) {
  const moment = (at: string) => momentText(at, now, reader)
  const lines = [...fill.checks.map((look) => lookLine(look, reader)), ...hoseLines(fill, reader, moment)]
  return (
    <section className="mt-8">
      <h2 className="mb-2 font-semibold">So far</h2>
      <ul className="list-none border-t border-rule p-0">
        {lines
          .sort((a, b) => Date.parse(b.at) - Date.parse(a.at))
          .map(({ at, text, note }) => (
            <li key={`${at} ${text}`} className={ROW}>
              <time dateTime={at} className="text-note text-graphite">
                {moment(at)}
              </time>
              <span>
                {text}
                {note ? <span className="block text-note whitespace-pre-line text-graphite">{note}</span> : null}
              </span>
            </li>
          ))}
      </ul>
    </section>
  )
}

interface Line {
  at: string
  text: string
  note?: string
}

function lookLine({ at, by, lowCornerDepthMm, note }: FillLook, reader: WordOptions): Line {
  const depth = lowCornerDepthMm === null ? '' : `: ${iceText(lowCornerDepthMm, reader)} at the low corner`
  return { at, text: `${by ?? 'Somebody'} looked${depth}`, note }
}

function hoseLines({ sessions, startedBy }: OpenFillView, reader: WordOptions, moment: (at: string) => string): Line[] {
  return sessions.map(({ startedAt, stoppedAt, litres }, index) => ({
    at: startedAt,
    text: `${stoppedAt ? `Hose ran until ${moment(stoppedAt)}` : 'Hose running'}: ${waterText(litres, reader)}`,
    note: index === 0 && startedBy ? `Started by ${startedBy}` : undefined,
  }))
}

/** With its weekday once it is not within the day any more. */
function momentText(at: string, now: string, reader: WordOptions): string {
  const isRecent = Date.parse(now) - Date.parse(at) < DAY_MILLIS / 2
  return isRecent ? clockText(at, reader) : `${weekdayText(at, reader).slice(0, 3)} ${clockText(at, reader)}`
}
