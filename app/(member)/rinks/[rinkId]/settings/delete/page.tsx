// The end of a rink, asked for by typing its name.
import type { Metadata } from 'next'
import { DeleteRinkForm } from '../_components/delete-rink-form'
import { readSettings } from '../_components/read-settings'
import { SettingsPage } from '../_components/settings-page'

export const metadata: Metadata = { title: 'Delete the rink' }

export default async function DeleteRinkPage({ params }: PageProps<'/rinks/[rinkId]/settings/delete'>) {
  const { rink } = await readSettings((await params).rinkId)
  return (
    <SettingsPage
      rink={rink}
      title="Delete the rink"
      lead="Its settings, log, forecasts kept and alerts go for good, for everybody on it. Export the log first if you want to keep it."
    >
      <DeleteRinkForm rinkId={rink.id} name={rink.name} />
    </SettingsPage>
  )
}
