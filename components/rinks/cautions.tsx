// What to mind tonight, gravest first.
import { Notice } from '../ui/notice'
import type { Caution } from '@/lib/advice/types'
import { cautionText } from '@/lib/words/cautions'
import type { WordOptions } from '@/lib/words/options'

export function Cautions({ cautions, reader }: { cautions: Caution[]; reader: WordOptions }) {
  if (cautions.length === 0) return null
  return (
    <section aria-labelledby="cautions" className="mt-7">
      <h2 id="cautions" className="sr-only">
        Cautions
      </h2>
      <Notice tone="caution">
        {cautions.map((caution) => (
          <p key={caution.code} className="my-1">
            {cautionText(caution, reader)}
          </p>
        ))}
      </Notice>
    </section>
  )
}
