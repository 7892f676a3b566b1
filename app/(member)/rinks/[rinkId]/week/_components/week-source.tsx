// How old the forecast is, which model judged it, and by which licence it may be shown.
import { ageText } from '@/components/rinks/reader'
import type { WeekView } from '@/lib/schemas/week-view'
import type { WordOptions } from '@/lib/words/options'
import { clockText } from '@/lib/words/times'

export function WeekSource({ view, reader }: { view: WeekView; reader: WordOptions }) {
  const { forecast, outlook } = view
  if (!forecast || !outlook) return null
  const issued = forecast.issuedAt ? `issued ${clockText(forecast.issuedAt, reader)}, ` : ''
  return (
    <p className="mt-5 text-small text-graphite">
      Forecast {issued}read {clockText(forecast.fetchedAt, reader)},{' '}
      {ageText(forecast.fetchedAt, Date.parse(view.readAt))}; judged {clockText(outlook.judgedAt, reader)} by model{' '}
      {outlook.modelVersion}.{' '}
      <a href={forecast.attribution.url} rel="noreferrer" className="underline">
        {forecast.attribution.text}
      </a>
      {forecast.attribution.licence ? `, ${forecast.attribution.licence}` : ''}. Thickness is an estimate: drill and
      measure before anyone skates.
    </p>
  )
}
