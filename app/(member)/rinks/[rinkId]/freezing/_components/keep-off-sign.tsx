// The sign for the gate. On paper it is all there is; on screen it shows what will be printed.
import { PrintButton } from '@/components/ui/print-button'
import type { FreezingOutlook } from '@/lib/advice/freezing'
import type { FreezingView } from '@/lib/schemas/freezing-view'
import { oldWeatherText, signEstimate, signTitle, type WeatherAge } from '@/lib/words/freezing'
import { clockText } from '@/lib/words/times'

interface Props {
  view: FreezingView
  outlook: FreezingOutlook
  weather: WeatherAge
}

export function KeepOffSign({ view, outlook, weather }: Props) {
  const { rink, reader, sinceAt, readAt, forecast } = view
  const estimate = signEstimate(outlook, reader, weather)
  const date = (at: string) =>
    new Intl.DateTimeFormat(reader.locale, {
      weekday: 'long',
      day: 'numeric',
      month: 'long',
      timeZone: reader.timeZone,
    }).format(Date.parse(at))
  return (
    <section className="mt-10 print:mt-0" aria-labelledby="keep-off">
      <div className="mb-4 flex flex-wrap items-center justify-between gap-3 print:hidden">
        <h2 className="font-semibold">A sign for the gate</h2>
        <PrintButton>Print the sign</PrintButton>
      </div>
      <div className="border-[3px] border-rust bg-sheet px-5 py-7 text-center lg:py-10 print:border-[8px] print:border-black print:bg-white print:py-[3cm] print:text-black">
        <p id="keep-off" className="text-verdict-wide font-semibold tracking-tight print:text-sign">
          {signTitle(outlook, weather)}
        </p>
        <p className="mt-3 text-verdict font-medium print:mt-8 print:text-sign-name">{rink.name}</p>
        <p className="mx-auto mt-5 max-w-line text-lead print:mt-10 print:text-verdict">
          {sinceAt ? `Freezing since ${date(sinceAt)}. ` : ''}
          {estimate ? `Estimated at ${clockText(readAt, reader)} on ${date(readAt)}: ${estimate} ` : ''}
          {weather === 'stale' && forecast ? oldWeatherText(forecast.fetchedAt, reader) : ''}
        </p>
        <p className="mx-auto mt-4 max-w-line text-body font-medium print:mt-8 print:text-verdict">
          An estimate is no measurement. Nobody goes on before the keeper has drilled and opened the rink.
        </p>
      </div>
    </section>
  )
}
