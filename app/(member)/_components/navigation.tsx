// The way round: a bar under the thumb on phones, a rail at the left from 1024 px. Shows only what the person may open.
'use client'
import Link from 'next/link'
import type { Route } from 'next'
import { useParams, usePathname } from 'next/navigation'
import { isGranted, type Role } from '@/lib/access/permissions'

interface Entry {
  href: string
  word: string
}

/** Entries for one rink, or for the pages that belong to none. */
export function entriesFor(rinkId: string | undefined, role: Role | undefined): Entry[] {
  const more = { href: '/account', word: 'More' }
  if (!rinkId || !role) return [{ href: '/rinks', word: 'Tonight' }, more]
  const entries = [{ href: `/rinks/${rinkId}`, word: 'Tonight' }]
  if (isGranted(role, 'receiveAlerts')) entries.push({ href: `/rinks/${rinkId}/alerts`, word: 'Alerts' })
  if (isGranted(role, 'manage')) entries.push({ href: `/rinks/${rinkId}/settings`, word: 'Rink' })
  return [...entries, more]
}

const LINK =
  'grid min-h-[60px] flex-1 place-items-center text-small text-graphite no-underline aria-[current]:font-semibold aria-[current]:text-ink ' +
  'aria-[current]:shadow-[inset_0_3px_0_var(--lamp)] lg:min-h-[52px] lg:flex-none lg:justify-items-start lg:px-6 lg:text-note ' +
  'lg:aria-[current]:shadow-[inset_3px_0_0_var(--lamp)]'

export function Navigation({ rinks }: { rinks: { id: string; role: Role }[] }) {
  const { rinkId } = useParams<{ rinkId?: string }>()
  const pathname = usePathname()
  const role = rinks.find((rink) => rink.id === rinkId)?.role
  return (
    <nav
      aria-label="Main"
      className="fixed inset-x-0 bottom-0 z-10 flex border-t border-rule bg-sheet pb-[env(safe-area-inset-bottom)] lg:inset-y-0 lg:right-auto lg:w-[164px] lg:flex-col lg:border-t-0 lg:border-r lg:pt-[72px] print:hidden"
    >
      {entriesFor(rinkId, role).map(({ href, word }) => (
        <Link key={href} href={href as Route} aria-current={pathname === href ? 'page' : undefined} className={LINK}>
          {word}
        </Link>
      ))}
    </nav>
  )
}
