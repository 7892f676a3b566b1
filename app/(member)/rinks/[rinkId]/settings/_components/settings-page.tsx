// The frame of one settings page: which rink, what it is about, and the way back to the others.
import type { Route } from 'next'
import Link from 'next/link'
import type { ReactNode } from 'react'
import { RinkFrame } from '@/components/rinks/rink-frame'

interface Props {
  rink: { id: string; name: string }
  title: string
  lead?: ReactNode
  /** Where "back" leads; the list of all settings unless said otherwise. */
  back?: { path: string; word: string }
  children: ReactNode
}

export function SettingsPage({ rink, title, lead, back = { path: '', word: 'All settings' }, children }: Props) {
  return (
    <RinkFrame name={rink.name} about="Settings">
      <div className="max-w-[34rem]">
        <Link
          href={`/rinks/${rink.id}/settings${back.path}` as Route}
          className="inline-flex min-h-touch items-center text-note underline"
        >
          {back.word}
        </Link>
        <h1 className="mt-1 mb-2 text-verdict font-medium">{title}</h1>
        {lead ? <p className="mb-5 max-w-line text-graphite">{lead}</p> : null}
        {children}
      </div>
    </RinkFrame>
  )
}
