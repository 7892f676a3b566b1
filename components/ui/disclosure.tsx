// Something to open one tap away; works without script.
import type { ReactNode } from 'react'

export function Disclosure({
  summary,
  children,
  className = '',
}: {
  summary: string
  children: ReactNode
  className?: string
}) {
  return (
    <details className={className}>
      <summary className="inline-flex min-h-touch cursor-pointer items-center underline print:hidden">
        {summary}
      </summary>
      {children}
    </details>
  )
}
