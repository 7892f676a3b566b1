// The rink's sources of water, the usual one first.
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { WATER_WORDS } from '@/components/rinks/choice-words'
import { ButtonLink } from '@/components/ui/button'
import { flowText, layerText, temperatureText } from '@/lib/words/quantities'
import { readSettings } from '../_components/read-settings'
import { SettingsPage } from '../_components/settings-page'

export const metadata: Metadata = { title: 'Water' }

export default async function WaterSettingsPage({ params }: PageProps<'/rinks/[rinkId]/settings/water'>) {
  const { rink, words } = await readSettings((await params).rinkId)
  const base = `/rinks/${rink.id}/settings/water`
  return (
    <SettingsPage rink={rink} title="Water" lead="Plans pour from the usual source; in the log you may name another.">
      <ul className="mb-6 list-none border-t border-rule p-0">
        {rink.sources.map((source) => (
          <li key={source.id} className="border-b border-rule">
            <Link href={`${base}/${source.id}` as Route} className="grid min-h-touch py-3 no-underline">
              <span className="font-medium">
                {WATER_WORDS[source.kind]}
                {source.isDefault ? <span className="font-normal text-graphite">, the usual one</span> : null}
              </span>
              <span className="text-note text-graphite">
                {flowText(source.flowLPerMin, words)}, {temperatureText(source.temperatureC, words)},{' '}
                {layerText(source.layerMm, words)} a pass
              </span>
            </Link>
          </li>
        ))}
      </ul>
      <ButtonLink href={`${base}/new` as Route}>Add a source</ButtonLink>
    </SettingsPage>
  )
}
