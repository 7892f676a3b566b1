// The season's thickness as a drawing of the server, so that it prints: the model as a line, what was drilled as marks.
import { dayText } from '@/components/rinks/reader'
import { scaleOf } from '@/lib/schemas/measures'
import type { ThicknessDay } from '@/lib/services/log-charts'
import type { WordOptions } from '@/lib/words/options'

/** The drawing is stretched to its frame; strokes keep their width, and the words stand outside. */
const SIDE = 1000
/** A scale that ends on a round figure above the thickest day. [mm] */
const SCALE_STEP_MM = 20

export function ThicknessCurve({ days, reader }: { days: ThicknessDay[]; reader: WordOptions }) {
  const first = days[0]
  const last = days.at(-1)
  if (!first || !last) return null
  const thickest = Math.max(1, ...days.flatMap(({ modelMm, readingMm }) => [modelMm ?? 0, readingMm ?? 0]))
  const most = Math.ceil(thickest / SCALE_STEP_MM) * SCALE_STEP_MM
  const at = (index: number, mm: number) =>
    `${((index / Math.max(1, days.length - 1)) * SIDE).toFixed(1)},${((1 - mm / most) * SIDE).toFixed(1)}`
  const { fromSi, unit } = scaleOf('iceThickness', reader.units)
  const marks = [most, most / 2, 0]
  return (
    <figure>
      <div className="grid grid-cols-[auto_1fr] gap-x-2">
        <div
          aria-hidden="true"
          className="flex flex-col justify-between text-right text-small leading-none text-graphite"
        >
          {marks.map((mm) => (
            <span key={mm}>{fromSi(mm).toFixed(1)}</span>
          ))}
        </div>
        <svg
          viewBox={`0 0 ${SIDE} ${SIDE}`}
          preserveAspectRatio="none"
          className="h-44 w-full overflow-visible"
          role="img"
          aria-label={`Thickness from ${dayText(first.date)} to ${dayText(last.date)}`}
        >
          {marks.map((mm) => (
            <polyline
              key={mm}
              points={`${at(0, mm)} ${SIDE},${at(0, mm).split(',')[1]}`}
              {...STROKE}
              stroke="var(--rule)"
            />
          ))}
          <polyline
            points={days.flatMap(({ modelMm }, index) => (modelMm === null ? [] : [at(index, modelMm)])).join(' ')}
            {...STROKE}
            stroke="var(--ink)"
            strokeWidth={1.8}
          />
          {days.map(({ date, readingMm }, index) =>
            readingMm === null ? null : <Drilled key={date} point={at(index, readingMm)} />,
          )}
        </svg>
      </div>
      <figcaption className="mt-1 text-small text-graphite">
        {dayText(first.date)} to {dayText(last.date)}, {unit}. Line: the model, at the end of each day. Squares:
        drilled.
      </figcaption>
    </figure>
  )
}

const STROKE = { fill: 'none', vectorEffect: 'non-scaling-stroke' } as const

/** A stroke without length, whose square ends are the mark: it keeps its shape however the drawing is stretched. */
function Drilled({ point }: { point: string }) {
  const mark = { d: `M${point} h0.01`, strokeLinecap: 'square', ...STROKE } as const
  return (
    <>
      <path {...mark} stroke="var(--ink)" strokeWidth={11} />
      <path {...mark} stroke="var(--lamp)" strokeWidth={8} />
    </>
  )
}
