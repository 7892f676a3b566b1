// Formulas with what they say and where they come from.
import type { Formula } from './formulas'

export function FormulaList({ title, formulas }: { title: string; formulas: Formula[] }) {
  return (
    <section className="mb-8 max-w-line">
      <h3 className="mb-2 font-semibold">{title}</h3>
      <dl className="border-t border-rule">
        {formulas.map(({ name, formula, text, source }) => (
          <div key={name} className="border-b border-rule py-3">
            <dt className="font-medium">{name}</dt>
            <dd>
              <p className="my-1 border-l-[3px] border-rule bg-sheet px-3 py-1.5 text-note">{formula}</p>
              <p className="text-note">{text}</p>
              <p className="text-small text-graphite">{source}</p>
            </dd>
          </div>
        ))}
      </dl>
    </section>
  )
}
