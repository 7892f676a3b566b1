// In phases that are about more than tonight's flood: what the rink is at, and the page for it.
import Link from 'next/link'
import type { Route } from 'next'
import { isGranted, type Role } from '@/lib/access/permissions'
import type { Phase } from '@/lib/advice/types'
import type { TonightView } from '@/lib/schemas/tonight-view'

interface PhaseWords {
  text: string
  link: string
  path: string
}

const WORDS: Partial<Record<Phase, PhaseWords>> = {
  waiting: {
    text: 'This rink waits for its fill day.',
    link: 'See the fill days',
    path: 'week',
  },
  filling: {
    text: 'This rink is being filled. Look after hose and liner every two hours.',
    link: 'Follow the fill',
    path: 'filling',
  },
  freezing: {
    text: 'The fill is freezing. Keep off until it carries; a drilled reading corrects the estimate.',
    link: 'Thickness, and when it carries',
    path: 'freezing',
  },
  thaw: {
    text: 'The rink is in a thaw. Stay off; it is judged anew each hour, and you hear when the cold is back.',
    link: 'The week to come',
    path: 'week',
  },
}

/** Water may go on again before anybody may. */
const COLD_IS_BACK: PhaseWords = {
  text: 'The rink was set to thawing, and the cold is back. Keep skaters off until you have drilled and it carries again.',
  link: 'Say what there is now',
  path: 'settings/ice',
}

/** For who comes to skate, not to flood. */
const OPEN: PhaseWords = {
  text: 'Open for skating, by its keeper’s word; thickness stays an estimate.',
  link: 'How the ice stands',
  path: 'freezing',
}

interface PhaseNoteProps extends Pick<TonightView, 'rink'> {
  isFloodNight: boolean
  role: Role
}

function wordsOf({ rink, isFloodNight, role }: PhaseNoteProps): PhaseWords | undefined {
  if (rink.phase === 'skating' && role === 'skater') return OPEN
  if (rink.phase !== 'thaw' || !isFloodNight) return WORDS[rink.phase]
  return isGranted(role, 'manage') ? COLD_IS_BACK : { ...COLD_IS_BACK, link: 'The week to come', path: 'week' }
}

export function PhaseNote(props: PhaseNoteProps) {
  const { rink } = props
  const words = wordsOf(props)
  if (!words) return null
  return (
    <p className="mb-5 max-w-[60ch]">
      {words.text}{' '}
      <Link
        href={`/rinks/${rink.id}/${words.path}` as Route}
        className="inline-flex min-h-touch items-center underline print:hidden"
      >
        {words.link}
      </Link>
    </p>
  )
}
