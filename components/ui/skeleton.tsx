// The outline of a page while it is read: a headline, a line below it, then what the page gives. Hidden without script,
// since only a script can put the page in its place.
import type { ReactNode } from 'react'

const HEADLINE = 'h-[68px] max-w-[22ch] bg-rule/40 text-verdict lg:h-[92px] lg:text-verdict-wide'

export function Skeleton({ says, hasLine = true, children }: { says: string; hasLine?: boolean; children: ReactNode }) {
  return (
    <div role="status" className="noscript:hidden">
      <span className="sr-only">{says}</span>
      <div aria-hidden="true" className="motion-safe:animate-pulse">
        <div className={HEADLINE} />
        {hasLine ? <div className="mt-3 mb-5 h-[51px] max-w-[60ch] bg-rule/40" /> : <div className="h-6" />}
        {children}
      </div>
    </div>
  )
}

/** Two columns of one height, one below the other on a phone. */
export function SkeletonColumns({ look }: { look: string }) {
  return (
    <div className="mt-8 gap-x-14 lg:grid lg:grid-cols-2">
      <div className={`bg-rule/40 ${look}`} />
      <div className={`mt-8 bg-rule/40 lg:mt-0 ${look}`} />
    </div>
  )
}
