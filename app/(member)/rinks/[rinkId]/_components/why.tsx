// Why these hours: each reason with its figure.
import { readerOf } from '@/components/rinks/quantities'
import { Facts } from '@/components/ui/facts'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { nightWords } from './night-words'

export function Why({ view }: { view: TonightView }) {
  const { why } = nightWords(view, readerOf(view))
  if (why.length === 0) return null
  return (
    <section>
      <h2 className="mt-8 mb-2 text-body font-semibold">
        {view.outlook?.summary.window ? 'Why these hours' : 'Why not'}
      </h2>
      <Facts
        rows={why.map(({ lead, text, figure }) => ({
          figure,
          name: (
            <>
              <b className="font-medium">{lead}</b> {text}
            </>
          ),
        }))}
      />
    </section>
  )
}
