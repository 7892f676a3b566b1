// Names with their figures, one hairline under each.
import type { ReactNode } from 'react'

export interface Fact {
  name: ReactNode
  figure: string
  isSum?: boolean
}

export function Facts({ rows, isDense }: { rows: Fact[]; isDense?: boolean }) {
  return (
    <dl>
      {rows.map(({ name, figure, isSum }, index) => (
        <div
          key={index}
          className={`grid grid-cols-[1fr_auto] gap-3 border-b border-rule ${isDense ? 'py-1' : 'py-[9px]'} ${isSum ? 'font-medium' : ''}`}
        >
          <dt>{name}</dt>
          <dd>{figure}</dd>
        </div>
      ))}
    </dl>
  )
}
