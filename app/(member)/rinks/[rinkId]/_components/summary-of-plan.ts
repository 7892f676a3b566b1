// What the headline counts: the passes that stand, the keeper's own or moved just now, in place of the advised ones.
import type { NightSummary } from '@/lib/advice/night-summary'
import type { TonightPass } from '@/lib/schemas/tonight-view'

/** Of a plan in which a pass does not set, no time is promised. */
export function summaryOfPlan(summary: NightSummary, passes: readonly TonightPass[]): NightSummary {
  const open = passes.filter(({ poured }) => poured === null)
  const setBys = open.flatMap(({ setBy }) => (setBy === null ? [] : [setBy])).sort()
  return {
    ...summary,
    passes: open.map((pass) => ({ ...pass, setBy: pass.setBy ?? summary.endsAt })),
    lastSetBy: setBys.length === open.length ? (setBys.at(-1) ?? null) : null,
  }
}
