// The rink's settings, for its keeper.
import type { Metadata } from 'next'
import { rinkValues } from '@/components/rinks/form/values'
import { PageFrame } from '@/components/ui/page-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getAccount } from '@/lib/services/own-account'
import { getRinkSettings } from '@/lib/services/rinks'
import { SettingsForm } from './_components/settings-form'

export const metadata: Metadata = { title: 'Rink settings' }

export default async function SettingsPage({ params }: PageProps<'/rinks/[rinkId]/settings'>) {
  const context = await pageContext()
  const rink = await orNotFound(getRinkSettings(context, (await params).rinkId))
  const { units } = await orNotFound(getAccount(context))
  return (
    <PageFrame>
      <div className="max-w-[34rem]">
        <h1 className="mb-2 text-verdict font-medium lg:text-verdict-wide">{rink.name}: settings</h1>
        <p className="max-w-line">The advice follows what you write here within a minute.</p>
        <SettingsForm initial={rinkValues(rink, units)} />
      </div>
    </PageFrame>
  )
}
