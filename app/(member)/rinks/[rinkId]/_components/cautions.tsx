// What to mind tonight, gravest first.
import { readerOf } from '@/components/rinks/quantities'
import { Notice } from '@/components/ui/notice'
import type { TonightView } from '@/lib/schemas/tonight-view'
import { nightWords } from './night-words'

export function Cautions({ view }: { view: TonightView }) {
  const { cautions } = nightWords(view, readerOf(view))
  if (cautions.length === 0) return null
  return (
    <section aria-labelledby="cautions" className="mt-7">
      <h2 id="cautions" className="sr-only">
        Cautions
      </h2>
      <Notice tone="caution">
        {cautions.map((caution) => (
          <p key={caution} className="my-1">
            {caution}
          </p>
        ))}
      </Notice>
    </section>
  )
}
