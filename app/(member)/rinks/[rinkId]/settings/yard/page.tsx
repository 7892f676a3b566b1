// Size, floor and boards, and what stands between the rink and wind and sky.
import type { Metadata } from 'next'
import { skyPercent, yardValues } from '@/components/rinks/form/settings-values'
import { YardForm } from '../_components/forms'
import { readSettings } from '../_components/read-settings'
import { SettingsPage } from '../_components/settings-page'

export const metadata: Metadata = { title: 'Size, floor and shelter' }

export default async function YardSettingsPage({ params }: PageProps<'/rinks/[rinkId]/settings/yard'>) {
  const { rink, words } = await readSettings((await params).rinkId)
  const initial = yardValues(rink, words.units)
  const keptSky = initial.sky === 'kept' ? `${skyPercent(rink.skyView)} of it` : undefined
  return (
    <SettingsPage rink={rink} title="Size, floor and shelter">
      <YardForm initial={initial} keptSky={keptSky} />
    </SettingsPage>
  )
}
