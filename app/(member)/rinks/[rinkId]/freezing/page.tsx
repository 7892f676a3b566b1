// A rink that freezes: how thick now and ahead, when it carries a skater, drilled holes, snow, and the sign to keep off.
import { randomUUID } from 'node:crypto'
import type { Metadata } from 'next'
import { RefreshEachMinute } from '@/components/ui/refresh-each-minute'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getFreezing } from '@/lib/services/freezing'
import { FreezingIce } from './_components/freezing-ice'
import { NotFreezing } from './_components/not-freezing'

export const metadata: Metadata = { title: 'Freezing' }

export default async function FreezingPage({ params }: PageProps<'/rinks/[rinkId]/freezing'>) {
  const view = await orNotFound(getFreezing(await pageContext(), (await params).rinkId))
  const entryKey = randomUUID()
  if (!view.outlook) return <NotFreezing view={view} entryKey={entryKey} />
  return (
    <>
      <RefreshEachMinute />
      <FreezingIce view={view} outlook={view.outlook} entryKey={entryKey} />
    </>
  )
}
