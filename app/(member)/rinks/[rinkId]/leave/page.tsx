// Giving up one's part in a rink.
import type { Metadata, Route } from 'next'
import { RinkFrame } from '@/components/rinks/rink-frame'
import { ButtonLink } from '@/components/ui/button'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getLeaving } from '@/lib/services/rink-end'
import { LeaveForm } from './_components/leave-form'

export const metadata: Metadata = { title: 'Leave the rink' }

export default async function LeavePage({ params }: PageProps<'/rinks/[rinkId]/leave'>) {
  const { rinkId } = await params
  const { rinkName, isOnlyKeeper } = await orNotFound(getLeaving(await pageContext(), rinkId))
  return (
    <RinkFrame name={rinkName} about="Leave">
      <div className="max-w-[34rem]">
        <h1 className="mb-3 text-verdict font-medium">
          {isOnlyKeeper ? 'Nobody else keeps it.' : `Leave ${rinkName}?`}
        </h1>
        <p className="mb-5 max-w-line">
          {isOnlyKeeper
            ? 'A rink needs a keeper, so you cannot leave it yet. Make somebody else keeper first, or delete it, with its log, for everybody on it.'
            : 'You hear no more of it and see it no more. What you wrote in its log stays.'}
        </p>
        {isOnlyKeeper ? (
          <div className="flex flex-wrap gap-3">
            <ButtonLink href={`/rinks/${rinkId}/people` as Route}>People</ButtonLink>
            <ButtonLink href={`/rinks/${rinkId}/settings/delete` as Route}>Delete the rink</ButtonLink>
          </div>
        ) : (
          <LeaveForm rinkId={rinkId} />
        )}
      </div>
    </RinkFrame>
  )
}
