// What there is now.
import type { Metadata } from 'next'
import { iceValues } from '@/components/rinks/form/settings-values'
import { IceForm } from '../_components/forms'
import { readSettings } from '../_components/read-settings'
import { SettingsPage } from '../_components/settings-page'

export const metadata: Metadata = { title: 'Ice now' }

export default async function IceSettingsPage({ params }: PageProps<'/rinks/[rinkId]/settings/ice'>) {
  const { rink, words } = await readSettings((await params).rinkId)
  return (
    <SettingsPage
      rink={rink}
      title="Ice now"
      lead="A fill moves this on by itself, and so does opening the rink. A thaw, its end and the end of the season you set here."
    >
      <IceForm initial={iceValues(rink, words.units)} />
    </SettingsPage>
  )
}
