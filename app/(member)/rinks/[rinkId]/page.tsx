// Tonight: the night sheet of one rink. The check comes before anything is sent, so that strangers get a true 404.
import type { Metadata } from 'next'
import { cache } from 'react'
import { z } from 'zod'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getTonight } from '@/lib/services/tonight'
import { TonightSheet } from './_components/tonight-sheet'

// Title and page ask for the same night; one request reads it once.
const readTonight = cache(async (rinkId: string) => orNotFound(readOf(rinkId)))

async function readOf(rinkId: string) {
  return getTonight(await pageContext(), z.uuid().parse(rinkId))
}

export async function generateMetadata({ params }: PageProps<'/rinks/[rinkId]'>): Promise<Metadata> {
  const { rink } = await readTonight((await params).rinkId)
  return { title: `Tonight at ${rink.name}` }
}

export default async function TonightPage({ params }: PageProps<'/rinks/[rinkId]'>) {
  return <TonightSheet initial={await readTonight((await params).rinkId)} />
}
