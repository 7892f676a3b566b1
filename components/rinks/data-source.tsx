// How old the data are, where they come from, and by which licence they may be shown.
import { ageText, readerOf } from './reader'
import { clockText } from '@/lib/words/times'
import type { TonightView } from '@/lib/schemas/tonight-view'

type SourceView = Pick<TonightView, 'forecast'> & {
  rink: Pick<TonightView['rink'], 'timeZone'>
  viewer: Pick<TonightView['viewer'], 'units' | 'clock'>
  outlook: { judgedAt: string; modelVersion: string } | null
}

export function DataSource({ view, now }: { view: SourceView; now: number }) {
  const { forecast, outlook } = view
  if (!forecast || !outlook) return null
  const reader = readerOf(view)
  const issued = forecast.issuedAt ? `issued ${clockText(forecast.issuedAt, reader)}, ` : ''
  return (
    <p className="mt-7 text-small text-graphite">
      Forecast {issued}read {clockText(forecast.fetchedAt, reader)}, {ageText(forecast.fetchedAt, now)}; judged{' '}
      {clockText(outlook.judgedAt, reader)} by model {outlook.modelVersion}.{' '}
      <a href={forecast.attribution.url} rel="noreferrer" className="underline">
        {forecast.attribution.text}
      </a>
      {forecast.attribution.licence ? `, ${forecast.attribution.licence}` : ''}.
    </p>
  )
}
