// A night to hold off: until when, and what would turn it, found by judging the night again with one thing changed.
import { readerOf } from '@/components/rinks/reader'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { holdUntilText, wouldTurnText } from '@/lib/words/hold'

type Judged = TonightView & { outlook: NonNullable<TonightView['outlook']> }

const WITH_A_SHEET = new Set(['freezing', 'skating', 'thaw'])

export function HoldNote({ view, now }: { view: Judged; now: number }) {
  const { summary, wouldTurn, days } = view.outlook
  if (summary.verdict !== 'hold') return null
  const reader = readerOf(view)
  return (
    <section>
      <h2 className="mt-8 mb-2 text-body font-semibold">Until when, and what would change it</h2>
      <p className="mb-1">{holdUntilText(summary, days.at(-1)?.date, new Date(now), reader)}</p>
      {!WITH_A_SHEET.has(view.rink.phase) ? null : wouldTurn.length > 0 ? (
        <ul className="list-none p-0">
          {wouldTurn.map((turn) => (
            <li key={turn.code} className="border-b border-rule py-[9px]">
              {wouldTurnText(turn, reader)}
            </li>
          ))}
        </ul>
      ) : (
        <p>No single change of the weather, and no thinner layer, would turn this night.</p>
      )}
    </section>
  )
}
