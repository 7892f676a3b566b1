// Heading of a page at the door, and what to know before acting.
import type { ReactNode } from 'react'

export function Title({ children, lead }: { children: ReactNode; lead?: ReactNode }) {
  return (
    <>
      <h1 className="mt-7 mb-2 text-verdict font-medium tracking-tight">{children}</h1>
      {lead ? <p className="mb-6 text-graphite">{lead}</p> : null}
    </>
  )
}
