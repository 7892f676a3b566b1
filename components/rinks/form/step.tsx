// One numbered step of the rink form.
import type { ReactNode } from 'react'

export function Step({ number, title, children }: { number: number; title: string; children: ReactNode }) {
  return (
    <section aria-labelledby={`step-${number}`} className="mt-8 border-t border-rule pt-6">
      <h2 id={`step-${number}`} className="mb-4 text-lead font-medium">
        <span className="text-graphite">{number}</span> {title}
      </h2>
      {children}
    </section>
  )
}
