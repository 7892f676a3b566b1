// My rinks. With one rink there is nothing to choose: its night sheet opens at once.
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { redirect } from 'next/navigation'
import { ButtonLink } from '@/components/ui/button'
import { PageFrame } from '@/components/ui/page-frame'
import { pageContext } from '@/lib/auth/request-context'
import { listMyRinksTonight } from '@/lib/services/my-rinks'

export const metadata: Metadata = { title: 'My rinks' }

const ROLES = { keeper: 'you keep it', crew: 'you flood it too', skater: 'you skate here' } as const

export default async function RinksPage() {
  const rinks = await listMyRinksTonight(await pageContext())
  const [only, second] = rinks
  if (only && !second) redirect(`/rinks/${only.id}`)
  return (
    <PageFrame>
      <h1 className="mb-5 max-w-[24ch] text-verdict font-medium lg:text-verdict-wide">
        {only ? 'My rinks' : 'No rink yet.'}
      </h1>
      {only ? null : (
        <p className="mb-5 max-w-line">
          Set up yours in about three minutes: where it is, how big it is, and the water you flood with.
        </p>
      )}
      {only ? (
        <ul className="mb-7 list-none border-t border-rule p-0">
          {rinks.map(({ id, name, placeName, role, tonight }) => (
            <li key={id} className="border-b border-rule">
              <Link href={`/rinks/${id}` as Route} className="grid min-h-touch py-3 no-underline">
                <span className="text-lead font-medium">{name}</span>
                {tonight ? <span className={tonight.isGood ? 'font-medium' : ''}>{tonight.sentence}</span> : null}
                <span className="text-note text-graphite">
                  {placeName}; {ROLES[role]}
                </span>
              </Link>
            </li>
          ))}
        </ul>
      ) : null}
      <ButtonLink href={'/rinks/new' as Route} look={only ? 'plain' : 'main'}>
        Set up a rink
      </ButtonLink>
    </PageFrame>
  )
}
