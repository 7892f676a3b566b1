// Everything of a rink that has no place in the bar: the build, the season, the settings, and one's own account.
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { RinkFrame } from '@/components/rinks/rink-frame'
import { isGranted, type RinkPermission } from '@/lib/access/permissions'
import { pageContext } from '@/lib/auth/request-context'
import { orNotFound } from '@/lib/http/or-not-found'
import { getMyRink } from '@/lib/services/my-rinks'

export const metadata: Metadata = { title: 'More' }

interface Place {
  path: string
  word: string
  about: string
  needs: RinkPermission
}

const GROUPS: { title: string; places: Place[] }[] = [
  {
    title: 'The build',
    places: [
      { path: 'plan', word: 'Plan the build', about: 'Water, hose hours, boards and liner', needs: 'view' },
      { path: 'filling', word: 'Filling', about: 'Water so far, level, checks', needs: 'view' },
      { path: 'freezing', word: 'Freezing', about: 'Thickness now and ahead', needs: 'view' },
    ],
  },
  {
    title: 'The season',
    places: [
      { path: 'log/kept', word: 'Forecasts kept', about: 'What was said and what came of it', needs: 'view' },
      { path: 'log/season', word: 'Season summary', about: 'Floods, water, nights; for printing', needs: 'view' },
    ],
  },
  {
    title: 'This rink',
    places: [
      { path: 'alerts', word: 'Alerts', about: 'When and how you are told', needs: 'receiveAlerts' },
      { path: 'people', word: 'People', about: 'Keeper, crew and skaters', needs: 'view' },
      { path: 'settings', word: 'Rink settings', about: 'Place, floor, water, hours, limits', needs: 'manage' },
    ],
  },
]

const ELSEWHERE = [
  { href: '/rinks', word: 'All your rinks', about: 'Change to another, or set one up' },
  { href: '/account', word: 'Your account', about: 'Units, theme, devices, data' },
  { href: '/how-it-works', word: 'How it works', about: 'The model, its accuracy and its limits' },
]

export default async function MorePage({ params }: PageProps<'/rinks/[rinkId]/more'>) {
  const rink = await orNotFound(getMyRink(await pageContext(), (await params).rinkId))
  return (
    <RinkFrame name={rink.name} about="More">
      <h1 className="sr-only">More of {rink.name}</h1>
      <div className="gap-x-14 lg:grid lg:grid-cols-2">
        {GROUPS.map(({ title, places }) => (
          <Group
            key={title}
            title={title}
            entries={places
              .filter(({ needs }) => isGranted(rink.role, needs))
              .map(({ path, ...entry }) => ({ ...entry, href: `/rinks/${rink.id}/${path}` }))}
          />
        ))}
        <Group title="Elsewhere" entries={ELSEWHERE} />
      </div>
    </RinkFrame>
  )
}

function Group({ title, entries }: { title: string; entries: { href: string; word: string; about: string }[] }) {
  if (entries.length === 0) return null
  return (
    <section className="mb-8">
      <h2 className="mb-1 border-b border-rule pb-2 font-semibold">{title}</h2>
      <ul className="list-none p-0">
        {entries.map(({ href, word, about }) => (
          <li key={href}>
            <Link
              href={href as Route}
              className="flex min-h-touch flex-wrap items-baseline gap-x-3 py-2 text-ink no-underline hover:underline"
            >
              <span className="font-medium">{word}</span>
              <span className="text-note text-graphite">{about}</span>
            </Link>
          </li>
        ))}
      </ul>
    </section>
  )
}
