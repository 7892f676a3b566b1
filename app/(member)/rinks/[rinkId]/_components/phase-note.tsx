// In phases that are about more than tonight's flood: what the rink is at, and the page for it.
import Link from 'next/link'
import type { Route } from 'next'
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
    link: 'Fill days of the week',
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

export function PhaseNote({ rink }: Pick<TonightView, 'rink'>) {
  const words = WORDS[rink.phase]
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
