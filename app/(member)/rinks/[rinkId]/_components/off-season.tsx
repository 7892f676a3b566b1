// A rink that is planned, or closed: no weather is read for it and nobody is told anything. What there is to do instead.
import type { Route } from 'next'
import { ButtonLink } from '@/components/ui/button'
import { isGranted } from '@/lib/access/permissions'
import type { Phase } from '@/lib/advice/types'
import type { TonightView } from '@/lib/schemas/tonight-view'

interface OffSeasonWords {
  title: string
  text: string
  link: { path: string; word: string }
}

export const OFF_SEASON: Partial<Record<Phase, OffSeasonWords>> = {
  planning: {
    title: 'Still being planned.',
    text: 'Sums of water, hose hours, boards and liner are there already. Once it stands, set the rink to waiting for its fill: from then on the weather is read for it.',
    link: { path: 'plan', word: 'Plan the build' },
  },
  closed: {
    title: 'Closed for the season.',
    text: 'No forecast is read and nobody is told anything until the rink is opened again in its settings.',
    link: { path: 'log/season', word: 'The season in figures' },
  },
}

export function OffSeason({
  rink,
  role,
}: {
  rink: Pick<TonightView['rink'], 'id' | 'phase'>
  role: TonightView['viewer']['role']
}) {
  const words = OFF_SEASON[rink.phase]
  if (!words) return null
  return (
    <>
      <h1 className="mt-7 mb-2 max-w-[24ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">
        {words.title}
      </h1>
      <p className="mb-5 max-w-line text-graphite">{words.text}</p>
      <div className="flex flex-wrap gap-3">
        <ButtonLink look="main" href={`/rinks/${rink.id}/${words.link.path}` as Route}>
          {words.link.word}
        </ButtonLink>
        {isGranted(role, 'manage') ? (
          <ButtonLink href={`/rinks/${rink.id}/settings/ice` as Route}>Change what there is now</ButtonLink>
        ) : null}
      </div>
    </>
  )
}
