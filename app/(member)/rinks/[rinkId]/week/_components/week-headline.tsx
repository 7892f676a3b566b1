// The nights ahead in one sentence, and what it comes to.
import type { WeekView } from '@/lib/schemas/week-view'
import type { WordOptions } from '@/lib/words/options'
import { unbroken } from '@/lib/words/unbroken'
import { weekDetail, weekHeadline, type WeekHeadline as Headline } from '@/lib/words/week'

const TONES: Record<Headline['tone'], string> = {
  flood: 'text-lamp-text',
  fill: 'text-hose',
  thaw: 'text-rust',
  plain: 'text-ink',
}

interface WeekHeadlineProps {
  view: WeekView
  outlook: NonNullable<WeekView['outlook']>
  reader: WordOptions
}

export function WeekHeadline({ view, outlook, reader }: WeekHeadlineProps) {
  const now = new Date(view.readAt)
  const { summary, fill, fillWindows } = outlook
  const week = { phase: view.rink.phase, summary, fill, fillWindows }
  const { before, key, after, tone } = weekHeadline(week, now, reader)
  const detail = weekDetail(week, now, reader)
  return (
    <>
      <h1 className="mb-2 max-w-[22ch] text-verdict font-medium tracking-tight lg:max-w-[26ch] lg:text-verdict-wide">
        {unbroken(before)}
        {before && key ? ' ' : ''}
        {key ? <em className={`font-semibold not-italic ${TONES[tone]}`}>{unbroken(key)}</em> : null}
        {unbroken(after)}
      </h1>
      {detail ? <p className="mb-5 max-w-[60ch] text-graphite">{detail}</p> : null}
    </>
  )
}
