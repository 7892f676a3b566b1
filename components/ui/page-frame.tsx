// The column of a page without a heading bar: one margin and one width everywhere.
import type { ReactNode } from 'react'

export function PageFrame({ children }: { children: ReactNode }) {
  return <main className="mx-auto max-w-page px-5 pt-7 pb-24 lg:pb-12">{children}</main>
}
