// When nothing freezes here: where the season is instead, and the way there.
import type { Route } from 'next'
import { ButtonLink } from '@/components/ui/button'
import { Notice } from '@/components/ui/notice'
import type { Phase } from '@/lib/advice/types'
import type { FreezingView } from '@/lib/schemas/freezing-view'
import { iceText } from '@/lib/words/quantities'
import { Drilled } from './drilled'

interface Words {
  title: string
  text: string
  path: string
  word: string
}

const BEFORE: Words = {
  title: 'No water is in yet.',
  text: 'Once a fill is finished, this page follows the ice: how thick it is, and when it should carry a skater.',
  path: '/filling',
  word: 'To the fill',
}

const WORDS: Record<Phase, Words> = {
  planning: BEFORE,
  waiting: BEFORE,
  filling: { ...BEFORE, title: 'The water is still running in.' },
  freezing: {
    title: 'No forecast has been read yet.',
    text: 'The ice is reckoned from the weather. It takes a few seconds once the weather service has answered; we ask again every few minutes. Until then, keep off.',
    path: '/freezing',
    word: 'Look again',
  },
  skating: {
    title: 'Open, by its keeper’s word.',
    text: 'From here on the night sheet says when to flood. Thickness stays an estimate: drill before the first skaters, after a thaw and after snow.',
    path: '',
    word: 'To the night sheet',
  },
  thaw: {
    title: 'The ice is thawing.',
    text: 'Keep off. The week says how much is lost and when the cold returns; drill before anyone goes back on.',
    path: '/week',
    word: 'To the week',
  },
  closed: {
    title: 'Closed for the season.',
    text: 'Nothing is followed until the rink is opened again in its settings.',
    path: '/log/season',
    word: 'The season in figures',
  },
}

/** The newest forecast does not reach this hour. */
const RUN_OUT: Words = {
  title: 'How thick the ice is cannot be reckoned.',
  text: 'The newest forecast has run out, and no newer one could be had; we ask again every hour. Until one comes, keep off: only a drilled hole tells how thick it is.',
  path: '/freezing',
  word: 'Look again',
}

export function NotFreezing({ view, entryKey }: { view: FreezingView; entryKey: string }) {
  const { rink, forecast, sheetMm, reader } = view
  const { title, text, path, word } = rink.phase === 'freezing' && forecast ? RUN_OUT : WORDS[rink.phase]
  const isUnderLimit = rink.phase === 'skating' && sheetMm !== null && sheetMm < rink.carriesSkaterMm
  return (
    <>
      <h1 className="mb-2 max-w-[24ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">{title}</h1>
      {isUnderLimit ? (
        <Notice tone="caution">
          <p>
            {iceText(sheetMm, reader)} of ice by the newest estimate, which is under the{' '}
            {iceText(rink.carriesSkaterMm, reader)} that carry a skater here. Keep off until a drilled hole says
            otherwise.
          </p>
        </Notice>
      ) : null}
      <p className="mb-5 max-w-line text-graphite">{text}</p>
      <ButtonLink look="main" href={`/rinks/${rink.id}${path}` as Route}>
        {word}
      </ButtonLink>
      {rink.phase === 'freezing' ? <Drilled view={view} entryKey={entryKey} /> : null}
    </>
  )
}
