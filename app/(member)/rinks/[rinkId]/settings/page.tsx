// All settings of a rink, for its keeper: what each says now, and the way to change it.
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { RinkFrame } from '@/components/rinks/rink-frame'
import { readSettings } from './_components/read-settings'
import { summaries } from './_components/summaries'

export const metadata: Metadata = { title: 'Rink settings' }

export default async function SettingsPage({ params }: PageProps<'/rinks/[rinkId]/settings'>) {
  const { rink, words } = await readSettings((await params).rinkId)
  const entries = [
    ...summaries(rink, words),
    { path: 'delete', word: 'Delete the rink', says: 'For good, with its log' },
  ]
  return (
    <RinkFrame name={rink.name} about="Settings">
      <div className="max-w-[34rem]">
        <h1 className="mb-2 text-verdict font-medium lg:text-verdict-wide">Rink settings</h1>
        <p className="mb-5 max-w-line text-graphite">The advice follows what you write here within a minute.</p>
        <ul className="list-none border-t border-rule p-0">
          {entries.map(({ path, word, says }) => (
            <li key={path} className="border-b border-rule">
              <Link href={`/rinks/${rink.id}/settings/${path}` as Route} className="grid min-h-touch py-3 no-underline">
                <span className="font-medium">{word}</span>
                <span className="text-note text-graphite">{says}</span>
              </Link>
            </li>
          ))}
        </ul>
      </div>
    </RinkFrame>
  )
}
