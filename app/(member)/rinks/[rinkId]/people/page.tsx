// Who is on the rink, and as what. Its keeper asks people in here.
import type { Metadata } from 'next'
import type { ReactNode } from 'react'
import { RinkFrame } from '@/components/rinks/rink-frame'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getPeople } from '@/lib/services/people'
import { ROLE_CAN, ROLE_NAMES } from '@/lib/words/roles'
import { InviteForm } from './_components/invite-form'
import { InvitedList } from './_components/invited-list'
import { PersonRow } from './_components/person-row'

export const metadata: Metadata = { title: 'People' }

export default async function PeoplePage({ params }: PageProps<'/rinks/[rinkId]/people'>) {
  const { rinkId } = await params
  const { rink, people, invited, isOnlyKeeper } = await orNotFound(getPeople(await pageContext(), rinkId))
  return (
    <RinkFrame name={rink.name} about="People">
      <h1 className="mb-5 text-verdict font-medium lg:text-verdict-wide">People</h1>
      <div className="gap-x-14 lg:grid lg:grid-cols-2">
        <div className="mb-10 max-w-[34rem]">
          <ul className="list-none border-t border-rule p-0">
            {people.map((person) => (
              <li key={person.userId} className="border-b border-rule">
                <PersonRow
                  rinkId={rinkId}
                  person={person}
                  mayChange={invited !== null}
                  isNeeded={person.isViewer && isOnlyKeeper}
                />
              </li>
            ))}
          </ul>
          {isOnlyKeeper ? (
            <p className="mt-3 max-w-line text-note text-graphite">
              You are its only keeper. To hand it on, make somebody else keeper first.
            </p>
          ) : null}
        </div>
        {invited ? (
          <div className="max-w-[34rem]">
            <Section title="Invite somebody">
              <InviteForm rinkId={rinkId} />
            </Section>
            {invited.length > 0 ? (
              <Section title="Invited">
                <InvitedList rinkId={rinkId} timeZone={rink.timeZone} invited={invited} />
              </Section>
            ) : null}
          </div>
        ) : (
          <Roles />
        )}
      </div>
    </RinkFrame>
  )
}

function Section({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="mb-10">
      <h2 className="mb-3 border-b border-rule pb-2 font-semibold">{title}</h2>
      {children}
    </section>
  )
}

function Roles() {
  return (
    <dl className="max-w-[34rem] text-note text-graphite">
      {(['keeper', 'crew', 'skater'] as const).map((role) => (
        <div key={role} className="mb-2">
          <dt className="inline font-medium text-ink">{ROLE_NAMES[role]}</dt>{' '}
          <dd className="inline">can {ROLE_CAN[role]}.</dd>
        </div>
      ))}
    </dl>
  )
}
