// Tonight: the night sheet of one rink. A page that is loaded comes whole, so that it reads without script and a stranger
// gets a true 404; moving to it from another screen shows its outline first.
import type { Metadata } from 'next'
import { headers } from 'next/headers'
import { cache, Suspense } from 'react'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { rinkIdSchema } from '@/lib/schemas/rinks'
import { getTonight } from '@/lib/services/tonight'
import { TonightSheet } from './_components/tonight-sheet'
import { TonightSkeleton } from './_components/tonight-skeleton'

// Title and page ask for the same night; one request reads it once.
const readTonight = cache(async (rinkId: string) => orNotFound(readOf(rinkId)))

async function readOf(rinkId: string) {
  return getTonight(await pageContext(), rinkIdSchema.parse(rinkId))
}

export async function generateMetadata({ params }: PageProps<'/rinks/[rinkId]'>): Promise<Metadata> {
  const { rink } = await readTonight((await params).rinkId)
  return { title: `Tonight at ${rink.name}` }
}

export default async function TonightPage({ params }: PageProps<'/rinks/[rinkId]'>) {
  const { rinkId } = await params
  const isLoaded = (await headers()).get('accept')?.includes('text/html')
  if (isLoaded) return <Tonight rinkId={rinkId} />
  return (
    <Suspense fallback={<TonightSkeleton />}>
      <Tonight rinkId={rinkId} />
    </Suspense>
  )
}

async function Tonight({ rinkId }: { rinkId: string }) {
  return <TonightSheet initial={await readTonight(rinkId)} />
}
