// The season's thickness as a drawing of the server, so that it prints: the model as a line, what was drilled as marks.
import { dayText, shortDayText } from '@/components/rinks/reader'
import type { ThicknessDay } from '@/lib/services/log-charts'
import { scaleOf } from '@/lib/schemas/measures'
import type { WordOptions } from '@/lib/words/options'

const WIDE = 720
const HIGH = 180
const LEFT = 44
const BOTTOM = 24
const TOP = 10
const MARK = 4

export function ThicknessCurve({ days, reader }: { days: ThicknessDay[]; reader: WordOptions }) {
  const first = days[0]
  const last = days.at(-1)
  if (!first || !last) return null
  const most = Math.max(10, ...days.flatMap(({ modelMm, readingMm }) => [modelMm ?? 0, readingMm ?? 0]))
  const x = (index: number) => LEFT + (index / Math.max(1, days.length - 1)) * (WIDE - LEFT - 8)
  const y = (mm: number) => TOP + (1 - mm / most) * (HIGH - TOP - BOTTOM)
  const line = days.flatMap(({ modelMm }, index) =>
    modelMm === null ? [] : [`${x(index).toFixed(1)},${y(modelMm).toFixed(1)}`],
  )
  const { fromSi, unit } = scaleOf('iceThickness', reader.units)
  return (
    <svg
      viewBox={`0 0 ${WIDE} ${HIGH}`}
      className="w-full"
      role="img"
      aria-label={`Thickness from ${dayText(first.date)} to ${dayText(last.date)}`}
    >
      {[0, most / 2, most].map((mm) => (
        <g key={mm}>
          <line x1={LEFT} x2={WIDE - 8} y1={y(mm)} y2={y(mm)} stroke="var(--rule)" />
          <text x={LEFT - 6} y={y(mm) + 4} textAnchor="end" fontSize={12} fill="var(--graphite)">
            {fromSi(mm).toFixed(1)}
          </text>
        </g>
      ))}
      <polyline points={line.join(' ')} fill="none" stroke="var(--ink)" strokeWidth={1.8} />
      {days.map(({ date, readingMm }, index) =>
        readingMm === null ? null : (
          <rect
            key={date}
            x={x(index) - MARK}
            y={y(readingMm) - MARK}
            width={2 * MARK}
            height={2 * MARK}
            fill="var(--lamp)"
            stroke="var(--ink)"
          />
        ),
      )}
      <text x={LEFT} y={HIGH - 6} fontSize={12} fill="var(--graphite)">
        {shortDayText(first.date)}
      </text>
      <text x={WIDE - 8} y={HIGH - 6} textAnchor="end" fontSize={12} fill="var(--graphite)">
        {dayText(last.date)}; line: model, squares: drilled, {unit}
      </text>
    </svg>
  )
}
