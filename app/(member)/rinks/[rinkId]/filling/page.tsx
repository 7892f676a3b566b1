// A fill while it runs: water so far, level at each corner, done by, looks. Without one: how to start it.
import type { Metadata } from 'next'
import { RefreshEachMinute } from '@/components/ui/refresh-each-minute'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getFilling } from '@/lib/services/filling'
import { NoFill } from './_components/no-fill'
import { OpenFill } from './_components/open-fill'

export const metadata: Metadata = { title: 'Filling' }

export default async function FillingPage({ params }: PageProps<'/rinks/[rinkId]/filling'>) {
  const view = await orNotFound(getFilling(await pageContext(), (await params).rinkId))
  if (!view.fill) return <NoFill view={view} />
  return (
    <>
      <RefreshEachMinute />
      <OpenFill view={view} fill={view.fill} />
    </>
  )
}
