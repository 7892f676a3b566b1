// When there are no nights to show: the season has not begun or is over, or no forecast has been read yet.
import type { Route } from 'next'
import { OFF_SEASON } from '../../_components/off-season'
import { ButtonLink } from '@/components/ui/button'
import type { WeekView } from '@/lib/schemas/week-view'

interface Words {
  title: string
  text: string
  link: { path: string; word: string }
}

export function WithoutNights({ view }: { view: WeekView }) {
  const { title, text, link } = wordsOf(view)
  return (
    <>
      <h1 className="mb-2 max-w-[24ch] text-verdict font-medium tracking-tight lg:text-verdict-wide">{title}</h1>
      <p className="mb-5 max-w-line text-graphite">{text}</p>
      <ButtonLink look="main" href={`/rinks/${view.rink.id}${link.path}` as Route}>
        {link.word}
      </ButtonLink>
    </>
  )
}

function wordsOf({ rink, outlook, lastReadFailed }: WeekView): Words {
  const offSeason = OFF_SEASON[rink.phase]
  if (offSeason) return { ...offSeason, link: { ...offSeason.link, path: `/${offSeason.link.path}` } }
  const again = { path: '/week', word: 'Look again' }
  if (outlook) {
    return {
      title: 'The forecast has run out.',
      text: 'The last one we could read covers no night from now on. We ask for a new one every hour.',
      link: again,
    }
  }
  return lastReadFailed
    ? {
        title: 'The first forecast could not be read.',
        text: 'The weather service did not answer. We try again every few minutes.',
        link: again,
      }
    : {
        title: 'Reading the first forecast.',
        text: 'It takes a few seconds, then the nights ahead stand here.',
        link: again,
      }
}
