// The sums of a rink before it is built. What is typed stands in the address when it is sent without script.
import type { Metadata } from 'next'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getPlan } from '@/lib/services/build-plan'
import { PlanBoard } from './_components/plan-board'
import { startValues, typedValues } from './_components/plan-values'

export const metadata: Metadata = { title: 'Plan the build' }

export default async function PlanPage({ params, searchParams }: PageProps<'/rinks/[rinkId]/plan'>) {
  const [{ rinkId }, query] = await Promise.all([params, searchParams])
  const { rink, reader, mayManage, today, start } = await orNotFound(getPlan(await pageContext(), rinkId))
  const kept = startValues(start, reader.units)
  const initial = { ...kept, ...typedValues(query) }
  return (
    <PlanBoard
      rinkId={rink.id}
      initial={initial}
      kept={kept}
      reader={reader}
      mayManage={mayManage}
      today={today}
      years={[start.seasonYear, start.seasonYear + 1]}
    />
  )
}
