// Why these hours, or why none: each reason with its figure.
import { Facts } from '@/components/ui/facts'
import type { NightSummary } from '@/lib/advice/night-summary'
import type { WordOptions } from '@/lib/words/options'
import { whyList } from '@/lib/words/why'

export function Why({ summary, reader }: { summary: NightSummary; reader: WordOptions }) {
  const items = whyList(summary.why, reader)
  if (items.length === 0) return null
  return (
    <section>
      <h2 className="mt-8 mb-2 text-body font-semibold">
        {summary.window ? 'Why these hours' : 'Where the heat goes'}
      </h2>
      <Facts
        rows={items.map(({ label, detail, figure }) => ({
          figure,
          name: (
            <>
              <b className="font-medium">{label}</b> {detail}
            </>
          ),
        }))}
      />
    </section>
  )
}
