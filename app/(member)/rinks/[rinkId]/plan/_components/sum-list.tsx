// Every sum with its figure, what it means, and how it was made, one tap away.
import type { SumItem } from '@/lib/words/sums'

export function SumList({ items }: { items: readonly SumItem[] }) {
  return (
    <dl className="border-t border-rule print:grid print:grid-cols-2 print:gap-x-8">
      {items.map(({ id, label, figure, detail, how }) => (
        <div
          key={id}
          className="grid grid-cols-[1fr_auto] gap-x-4 border-b border-rule py-[11px] print:py-0.5 print:text-note"
        >
          <dt>{label}</dt>
          <dd className="text-right text-lead font-semibold print:text-note">{figure}</dd>
          <dd className="col-span-2 text-note text-graphite print:text-small">
            <details>
              <summary className="flex min-h-touch cursor-pointer items-center justify-between gap-4 lg:min-h-8 print:min-h-0">
                <span>{detail}</span>
                <span className="shrink-0 text-small underline print:hidden">
                  how<span className="sr-only"> “{label}” is reckoned</span>
                </span>
              </summary>
              <p className="text-small text-ink">{how.formula}</p>
              <p className="mt-1 text-small text-ink">{how.worked}</p>
              <p className="mt-1 mb-2 text-small">{how.source}</p>
            </details>
          </dd>
        </div>
      ))}
    </dl>
  )
}
