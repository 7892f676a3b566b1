// Whom the keeper waits for, each with the way to mail again and to take it back.
import { formatInTimeZone } from 'date-fns-tz'
import type { Invited } from '@/lib/services/people'
import { AS_ROLE } from '@/lib/words/roles'
import { SendAgain, TakeBack } from './invitation-buttons'

export function InvitedList({ rinkId, timeZone, invited }: { rinkId: string; timeZone: string; invited: Invited[] }) {
  return (
    <ul className="list-none p-0">
      {invited.map(({ id, email, role, expiresAt, hasRunOut, hasFailed }) => (
        <li key={id} className="border-b border-rule py-3 first:pt-0">
          <p className="font-medium break-words">{email}</p>
          <p className="text-note text-graphite">
            {AS_ROLE[role]}, {hasRunOut ? 'ran out on' : 'good until'} {formatInTimeZone(expiresAt, timeZone, 'd MMMM')}
          </p>
          {hasFailed ? (
            <p className="text-note text-rust">The mail did not get there. Check the spelling of the address.</p>
          ) : null}
          <div className="mt-2 flex flex-wrap items-start gap-3">
            <SendAgain rinkId={rinkId} invitationId={id} email={email} />
            <TakeBack rinkId={rinkId} invitationId={id} email={email} />
          </div>
        </li>
      ))}
    </ul>
  )
}
