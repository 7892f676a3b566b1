// The verdict as one sentence, and how sure it is.
import { readerOf } from '@/components/rinks/reader'
import type { NightSummary } from '@/lib/advice/night-summary'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { sureSentence, verdictParts } from '@/lib/words/night'
import { unbroken } from '@/lib/words/unbroken'

const LEAD_COLOURS: Record<NightSummary['verdict'], string> = {
  flood: 'text-lamp-text',
  fill: 'text-hose',
  hold: 'text-ink',
  unknown: 'text-ink',
}

export function Verdict({
  view,
  summary,
  now,
}: {
  view: Pick<TonightView, 'viewer' | 'rink'>
  summary: NightSummary
  now: number
}) {
  const reader = readerOf(view)
  const { lead, rest } = verdictParts(summary, new Date(now), reader)
  const sure = sureSentence(summary, reader)
  return (
    <>
      <h1 className="mt-7 mb-2 max-w-[22ch] text-verdict font-medium tracking-tight lg:max-w-[24ch] lg:text-verdict-wide">
        <em className={`font-semibold not-italic ${LEAD_COLOURS[summary.verdict]}`}>{lead}</em>
        {/^[.:]/.test(rest) ? '' : ' '}
        {unbroken(rest)}
      </h1>
      <p className="mb-5 max-w-[60ch] text-graphite">{unbroken(sure)}</p>
    </>
  )
}
