// When no fill is open: how to start one, or where the season is instead.
import type { Route } from 'next'
import { ButtonLink } from '@/components/ui/button'
import { StandingCautions } from '@/components/rinks/standing-cautions'
import { hasIce } from '@/lib/schemas/rink-choices'
import type { FillingView } from '@/lib/schemas/filling-view'
import { waterText } from '@/lib/words/quantities'
import { clockText } from '@/lib/words/times'
import { longDayText } from '@/lib/words/week'
import { FILLING_CAUTIONS } from './filling-cautions'
import { StartFill } from './start-fill'

export function NoFill({ view }: { view: FillingView }) {
  const { rink, reader, mayWrite, usual } = view
  const { title, text } = wordsOf(view)
  const isAhead = !hasIce(rink.phase)
  return (
    <>
      <h1 className="mb-2 max-w-[24ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">{title}</h1>
      <p className="mb-5 max-w-line text-graphite">{text}</p>
      <div className="flex flex-wrap gap-3">
        {isAhead ? (
          <>
            <ButtonLink href={`/rinks/${rink.id}/week` as Route}>Find the fill day</ButtonLink>
            <ButtonLink href={`/rinks/${rink.id}/plan` as Route}>Plan the build</ButtonLink>
          </>
        ) : (
          <ButtonLink look="main" href={`/rinks/${rink.id}${rink.phase === 'freezing' ? '/freezing' : ''}` as Route}>
            {rink.phase === 'freezing' ? 'How thick is it' : 'To the night sheet'}
          </ButtonLink>
        )}
      </div>
      {isAhead && mayWrite ? (
        <div className="gap-x-14 lg:grid lg:grid-cols-2">
          <StartFill rinkId={rink.id} usual={usual} units={reader.units} />
          <StandingCautions codes={FILLING_CAUTIONS} reader={reader} heading="Before the water runs" />
        </div>
      ) : null}
    </>
  )
}

function wordsOf({ rink, last, mayWrite, reader }: FillingView): { title: string; text: string } {
  const water = last
    ? `${waterText(last.litres, reader)} went in, done on ${longDayText(last.finishedAt, reader)} at ${clockText(last.finishedAt, reader)}.`
    : ''
  if (rink.phase === 'freezing') return { title: 'The water is in.', text: `${water} Now it freezes: keep off.`.trim() }
  if (hasIce(rink.phase)) {
    return {
      title: 'There is ice already.',
      text: 'A fill starts before the first ice. To start over, its keeper sets the rink back to waiting in the settings.',
    }
  }
  return mayWrite
    ? {
        title: 'No fill is running.',
        text: 'Start it when the hose starts: from then on this page reckons the water, the level at each corner and the end, and reminds you to look.',
      }
    : { title: 'No fill is running.', text: 'Once somebody starts it, this page shows how far the water is.' }
}
