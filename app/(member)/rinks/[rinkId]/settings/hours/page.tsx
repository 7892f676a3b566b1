// When somebody can go out.
import type { Metadata } from 'next'
import { hoursValues } from '@/components/rinks/form/settings-values'
import { HoursForm } from '../_components/forms'
import { readSettings } from '../_components/read-settings'
import { SettingsPage } from '../_components/settings-page'

export const metadata: Metadata = { title: 'Hours' }

export default async function HoursSettingsPage({ params }: PageProps<'/rinks/[rinkId]/settings/hours'>) {
  const { rink } = await readSettings((await params).rinkId)
  return (
    <SettingsPage rink={rink} title="Hours">
      <HoursForm initial={hoursValues(rink)} />
    </SettingsPage>
  )
}
