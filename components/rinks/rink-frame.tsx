// The frame of a rink's page: its header, then the page itself, one margin and one width everywhere.
import type { ComponentProps, ReactNode } from 'react'
import { RinkHeader } from './rink-header'

export function RinkFrame({ children, ...header }: ComponentProps<typeof RinkHeader> & { children: ReactNode }) {
  return (
    <div className="mx-auto max-w-page px-5 pb-24 lg:px-9 lg:pb-12 print:p-0">
      <RinkHeader {...header} />
      <main className="pt-6">{children}</main>
    </div>
  )
}
