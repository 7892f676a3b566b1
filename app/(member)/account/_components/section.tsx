// One part of an account page.
import type { ReactNode } from 'react'

export function Section({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="mt-8 border-t border-rule pt-6">
      <h2 className="mb-3 font-semibold">{title}</h2>
      {children}
    </section>
  )
}
