// One person of the rink: name and role, and for the keeper the way to change it, a tap away.
import type { Route } from 'next'
import Link from 'next/link'
import type { Person } from '@/lib/services/people'
import { ROLE_NAMES } from '@/lib/words/roles'
import { RoleForm, TakeOffForm } from './person-forms'

interface Props {
  rinkId: string
  person: Person
  /** The viewer keeps the rink. */
  mayChange: boolean
  /** Neither changes nor leaves: a rink needs its keeper. */
  isNeeded: boolean
}

const ROW = 'flex min-h-touch items-center gap-4 py-2'

export function PersonRow({ rinkId, person, mayChange, isNeeded }: Props) {
  const { userId, name, role, isViewer } = person
  if (!mayChange || isNeeded) {
    return (
      <div className={ROW}>
        <Who {...person} />
        {isViewer && !isNeeded ? <Leave rinkId={rinkId} /> : null}
      </div>
    )
  }
  const which = { rinkId, userId, name }
  return (
    <details className="group">
      <summary className={`${ROW} cursor-pointer list-none [&::-webkit-details-marker]:hidden`}>
        <Who {...person} />
        <span className="underline group-open:hidden">Change</span>
        <span className="hidden underline group-open:inline">Close</span>
      </summary>
      <div className="pb-6">
        <RoleForm {...which} role={role} />
        <div className="mt-6">
          {isViewer ? (
            <Leave rinkId={rinkId} />
          ) : (
            <>
              <p className="mb-3 max-w-line text-note text-graphite">
                Who is taken off sees the rink no more and hears no more of it. What they wrote in its log stays.
              </p>
              <TakeOffForm {...which} />
            </>
          )}
        </div>
      </div>
    </details>
  )
}

function Who({ name, role, isViewer }: Person) {
  return (
    <span className="min-w-0 grow">
      <span className="block font-medium break-words">
        {name}
        {isViewer ? <span className="font-normal text-graphite"> (you)</span> : null}
      </span>
      <span className="block text-note text-graphite">{ROLE_NAMES[role]}</span>
    </span>
  )
}

function Leave({ rinkId }: { rinkId: string }) {
  return (
    <Link href={`/rinks/${rinkId}/leave` as Route} className="inline-flex min-h-touch items-center underline">
      Leave the rink
    </Link>
  )
}
