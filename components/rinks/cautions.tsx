// What to mind tonight, gravest first.
import { Notice } from '../ui/notice'
import type { Caution } from '@/lib/advice/types'
import { cautionText } from '@/lib/words/cautions'
import type { WordOptions } from '@/lib/words/options'

interface CautionsProps {
  cautions: Caution[]
  reader: WordOptions
  /** Shown; without one there is a heading for screen readers. */
  heading?: string
}

export function Cautions({ cautions, reader, heading }: CautionsProps) {
  if (cautions.length === 0) return null
  return (
    <section className="mt-7">
      <h2 className={heading ? 'mb-2 text-body font-semibold' : 'sr-only'}>{heading ?? 'Cautions'}</h2>
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
