// How the water spreads over the floor, hour by hour of hose: small bars, and the same as a table.
import { BarredPattern } from '@/components/charts/barred-pattern'
import { DataTable } from '@/components/ui/data-table'
import { Disclosure } from '@/components/ui/disclosure'
import type { BuildSums, WettedHour } from '@/lib/advice/build-types'
import { depthText, shareText } from '@/lib/words/build-quantities'
import type { WordOptions } from '@/lib/words/options'
import { areaText, numberText, waterText } from '@/lib/words/quantities'

/** A long fill is shown by every second, third … hour. */
const MOST_ROWS = 16
const BAR = { width: 20, gap: 6, height: 80 }

export function Wetted({ sums, reader }: { sums: BuildSums; reader: WordOptions }) {
  const hours = everySo(sums.wetted.byHour)
  const whole = sums.wetted.byHour.find(({ wettedShare }) => wettedShare > 0.995)
  const hoursText = (value: number) => `${numberText(value, Number.isInteger(value) ? 0 : 1, reader)} h`
  const text = whole
    ? `Water covers the whole floor after ${hoursText(whole.hours)} of hose.`
    : 'Water does not reach the whole floor.'
  return (
    <section className="mt-8 print:hidden">
      <h2 className="mb-2 font-semibold">How the water spreads</h2>
      <Bars hours={hours} description={text} />
      <p className="mt-1 max-w-line text-small text-graphite">
        Share of the floor under water by hours of hose, {hoursText(hours[0]?.hours ?? 0)} to{' '}
        {hoursText(hours.at(-1)?.hours ?? 0)}. {text} Walk the hose end round meanwhile: a spot that the water does not
        reach lifts in the wind.
      </p>
      <Disclosure summary="Show as table" className="text-small">
        <DataTable
          caption="Water by hours of hose"
          columns={[
            { head: 'Hose' },
            { head: 'Water', isFigure: true },
            { head: 'Wet', isFigure: true },
            { head: 'Of the floor', isFigure: true },
            { head: 'Low corner', isFigure: true },
          ]}
          rows={hours.map((hour) => ({
            key: String(hour.hours),
            cells: [
              hoursText(hour.hours),
              waterText(hour.litres, reader),
              areaText(hour.wettedM2, reader),
              shareText(hour.wettedShare, reader),
              depthText(Math.max(...hour.cornerDepthsM), reader),
            ],
          }))}
        />
      </Disclosure>
    </section>
  )
}

function Bars({ hours, description }: { hours: readonly WettedHour[]; description: string }) {
  const step = BAR.width + BAR.gap
  return (
    <svg
      viewBox={`0 0 ${Math.max(10, hours.length) * step} ${BAR.height + 1}`}
      role="img"
      aria-label={description}
      className="block h-auto max-h-28 w-full"
      preserveAspectRatio="xMinYMax meet"
    >
      <defs>
        <BarredPattern id="wetted-barred" />
      </defs>
      {hours.map(({ hours: at, wettedShare }, index) => (
        <rect
          key={at}
          x={index * step + 1}
          y={BAR.height * (1 - wettedShare)}
          width={BAR.width}
          height={BAR.height * wettedShare}
          fill="url(#wetted-barred)"
          className="stroke-hose"
        />
      ))}
      <line x1="0" x2={Math.max(10, hours.length) * step} y1={BAR.height} y2={BAR.height} className="stroke-graphite" />
    </svg>
  )
}

function everySo(hours: readonly WettedHour[]): WettedHour[] {
  const step = Math.ceil(hours.length / MOST_ROWS)
  return hours.filter((_, index) => (index + 1) % step === 0 || index === hours.length - 1)
}
