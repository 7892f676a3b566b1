// Name, place and clock of a rink.
import type { Metadata } from 'next'
import { placeValues } from '@/components/rinks/form/settings-values'
import { PlaceForm } from '../_components/forms'
import { readSettings } from '../_components/read-settings'
import { SettingsPage } from '../_components/settings-page'

export const metadata: Metadata = { title: 'Name, place and clock' }

export default async function PlaceSettingsPage({ params }: PageProps<'/rinks/[rinkId]/settings/place'>) {
  const { rink } = await readSettings((await params).rinkId)
  return (
    <SettingsPage
      rink={rink}
      title="Name, place and clock"
      lead="In a new place the rink gets the weather of that place within minutes."
    >
      <PlaceForm initial={placeValues(rink)} />
    </SettingsPage>
  )
}
