// Something to open one tap away; works without script.
import type { ReactNode } from 'react'

export function Disclosure({
  summary,
  children,
  className = '',
  open,
}: {
  summary: string
  children: ReactNode
  className?: string
  /** Open from the start, or opened again because something in it needs a look. */
  open?: boolean
}) {
  return (
    <details className={className} open={open}>
      <summary className="inline-flex min-h-touch cursor-pointer items-center underline print:hidden">
        {summary}
      </summary>
      {children}
    </details>
  )
}
