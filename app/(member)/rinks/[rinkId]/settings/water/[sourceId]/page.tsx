// One source of water: changed, made the usual one, or removed; "new" adds one.
import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { waterValues } from '@/components/rinks/form/settings-values'
import { WATER_WORDS } from '@/components/rinks/choice-words'
import { pourFromAction, removeWaterAction } from '../../actions'
import { OneTap } from '../../_components/one-tap'
import { readSettings } from '../../_components/read-settings'
import { SettingsPage } from '../../_components/settings-page'
import { WaterForm } from '../../_components/water-form'

export const metadata: Metadata = { title: 'A source of water' }

export default async function OneWaterPage({ params }: PageProps<'/rinks/[rinkId]/settings/water/[sourceId]'>) {
  const { rinkId, sourceId } = await params
  const { rink, words } = await readSettings(rinkId)
  const source = rink.sources.find(({ id }) => id === sourceId)
  if (!source && sourceId !== 'new') notFound()
  return (
    <SettingsPage
      rink={rink}
      title={source ? WATER_WORDS[source.kind] : 'Add a source'}
      lead={source?.isDefault ? 'The usual source: plans pour from it.' : undefined}
      back={{ path: '/water', word: 'All water' }}
    >
      <WaterForm initial={waterValues(rink, words.units, source?.id)} isNew={!source} />
      {source && !source.isDefault ? (
        <div className="mt-8 flex flex-wrap gap-3 border-t border-rule pt-6">
          <OneTap action={pourFromAction} submit="Make it the usual one" rinkId={rink.id} sourceId={source.id} />
          <OneTap action={removeWaterAction} submit="Remove it" rinkId={rink.id} sourceId={source.id} />
        </div>
      ) : null}
    </SettingsPage>
  )
}
