// The way round: a bar under the thumb on phones, a rail at the left from 1024 px.
'use client'
import Link, { useLinkStatus } from 'next/link'
import type { Route } from 'next'
import { useParams, usePathname } from 'next/navigation'
import type { Role } from '@/lib/access/permissions'

interface Entry {
  href: string
  word: string
}

const RINKS: Entry = { href: '/rinks', word: 'Rinks' }

/** Entries for one rink, or for the pages that belong to none. */
export function entriesFor(rinkId: string | undefined, role: Role | undefined): Entry[] {
  if (!rinkId || !role) return [RINKS, { href: '/account', word: 'Account' }]
  const base = `/rinks/${rinkId}`
  return [
    { href: base, word: 'Tonight' },
    { href: `${base}/week`, word: 'Week' },
    { href: `${base}/log`, word: 'Log' },
    { href: `${base}/more`, word: 'More' },
  ]
}

/** The entry a page belongs to: what has no entry of its own is reached through More. */
export function entryOf(pathname: string, entries: readonly Entry[]): Entry | undefined {
  const within = ({ href }: Entry) => pathname === href || pathname.startsWith(`${href}/`)
  const nearest = entries.filter(within).sort((a, b) => b.href.length - a.href.length)[0]
  const isDeeper = nearest !== undefined && nearest === entries[0] && pathname !== nearest.href
  return isDeeper && nearest.word === 'Tonight' ? entries.at(-1) : nearest
}

/** A tap is answered at once, also where the page takes its time. */
function Word({ children }: { children: string }) {
  const { pending } = useLinkStatus()
  return <span data-pending={pending || undefined}>{children}</span>
}

const LINK =
  'grid min-h-[60px] flex-1 place-items-center text-small text-graphite no-underline aria-[current]:font-semibold aria-[current]:text-ink ' +
  'aria-[current]:shadow-[inset_0_3px_0_var(--lamp)] lg:min-h-[52px] lg:flex-none lg:justify-items-start lg:px-6 lg:text-note ' +
  'lg:aria-[current]:shadow-[inset_3px_0_0_var(--lamp)] ' +
  'has-data-pending:text-ink has-data-pending:shadow-[inset_0_3px_0_var(--graphite)] lg:has-data-pending:shadow-[inset_3px_0_0_var(--graphite)]'

export function Navigation({ rinks }: { rinks: { id: string; role: Role }[] }) {
  const { rinkId } = useParams<{ rinkId?: string }>()
  const pathname = usePathname()
  const role = rinks.find((rink) => rink.id === rinkId)?.role
  const entries = entriesFor(rinkId, role)
  const current = entryOf(pathname, entries)
  return (
    <nav
      aria-label="Main"
      className="fixed inset-x-0 bottom-0 z-10 flex border-t border-rule bg-sheet pb-[env(safe-area-inset-bottom)] lg:inset-y-0 lg:right-auto lg:w-[164px] lg:flex-col lg:border-t-0 lg:border-r lg:pt-[72px] print:hidden"
    >
      {entries.map((entry) => (
        <Link
          key={entry.href}
          href={entry.href as Route}
          aria-current={entry !== current ? undefined : pathname === entry.href ? 'page' : 'true'}
          className={LINK}
        >
          <Word>{entry.word}</Word>
        </Link>
      ))}
    </nav>
  )
}
