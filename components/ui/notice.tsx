// A caution or a message: a rule at the left, never colour alone.
import type { ReactNode } from 'react'

export function Notice({
  tone = 'plain',
  live,
  children,
}: {
  tone?: 'plain' | 'caution'
  live?: boolean
  children: ReactNode
}) {
  const line = tone === 'caution' ? 'border-rust' : 'border-graphite'
  return (
    <div role={live ? 'status' : undefined} className={`my-5 border-l-[3px] py-0.5 pl-3.5 text-note ${line}`}>
      {children}
    </div>
  )
}
