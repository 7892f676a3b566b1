// What the keeper bears, and what ice has to.
import type { Metadata } from 'next'
import { limitsValues } from '@/components/rinks/form/settings-values'
import { LimitsForm } from '../_components/forms'
import { readSettings } from '../_components/read-settings'
import { SettingsPage } from '../_components/settings-page'

export const metadata: Metadata = { title: 'Limits' }

export default async function LimitsSettingsPage({ params }: PageProps<'/rinks/[rinkId]/settings/limits'>) {
  const { rink, words } = await readSettings((await params).rinkId)
  return (
    <SettingsPage rink={rink} title="Limits" lead="They stand beside the model, which knows the ice and not you.">
      <LimitsForm initial={limitsValues(rink, words.units)} />
    </SettingsPage>
  )
}
