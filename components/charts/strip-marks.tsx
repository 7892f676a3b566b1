// Around the bars: snow and rain along the floor, the hours, the passes, and now.
import type { StripLayout } from './night-strip-layout'
import { FLOOR, type StripPartProps } from './strip-parts'

export function Floor({ layout, words }: StripPartProps) {
  const y = layout.frame.plotBottom
  return (
    <g>
      {layout.marks.map(({ kind, x, radius }) =>
        kind === 'snow' ? (
          <circle
            key={`snow${x}`}
            cx={x}
            cy={y + FLOOR.marks}
            r={radius}
            className="fill-sheet stroke-graphite"
            strokeWidth={1.3}
          />
        ) : (
          <path
            key={`rain${x}`}
            d={`M${x + radius / 2},${y + FLOOR.marks - radius} l${-radius},${2 * radius}`}
            className="stroke-graphite"
            strokeWidth={2}
          />
        ),
      )}
      {words.amounts.map(({ x, text }) => (
        <text key={x} x={x} y={y + FLOOR.amounts} textAnchor="middle" className="fill-ink">
          {text}
        </text>
      ))}
      {words.hourTicks.map(({ x, text }) => (
        <text key={x} x={x} y={y + FLOOR.hours} textAnchor="middle" className="fill-graphite">
          {text}
        </text>
      ))}
    </g>
  )
}

/** A pass that is still wet when the next begins has its name over what is before that. */
function roomOf(brackets: StripLayout['brackets'], place: number): number {
  const { x = 0, width = 0 } = brackets[place] ?? {}
  return Math.min(width, ...brackets.map((other) => other.x - x).filter((ahead) => ahead > 0))
}

/** From pour to set; a poured pass is a wedge at its pour. */
export function Passes({ layout, words, brackets }: StripPartProps & { brackets: StripLayout['brackets'] }) {
  const top = layout.frame.plotTop - 11
  return (
    <g>
      {brackets.map(({ number, x, width, isPoured }, place) => (
        <g key={number}>
          {isPoured ? (
            <path d={`M${x - 5},${top} h10 l-5,9 z`} className="fill-ink" />
          ) : (
            <path
              d={`M${x + 1},${top + 8} v-8 h${Math.max(width - 2, 1)} v8`}
              fill="none"
              className="stroke-ink"
              strokeWidth={1.4}
            />
          )}
          <text
            x={isPoured ? x : x + roomOf(brackets, place) / 2}
            y={top - 6}
            textAnchor="middle"
            className="fill-ink"
            fontWeight={500}
          >
            {words.passLabel(number, isPoured ? 0 : roomOf(brackets, place))}
          </text>
        </g>
      ))}
    </g>
  )
}

export function Now({ layout, word }: { layout: StripLayout; word: string }) {
  const { frame, nowX } = layout
  if (nowX === null) return null
  const half = word.length * 3.3
  const x = Math.min(Math.max(nowX, half + 4), frame.width - half - 4)
  return (
    <g>
      <line
        x1={nowX}
        x2={nowX}
        y1={18}
        y2={frame.plotBottom + FLOOR.ground}
        className="stroke-rust"
        strokeWidth={1.4}
      />
      <text x={x} y={13} textAnchor="middle" className="fill-rust" fontWeight={500}>
        {word}
      </text>
    </g>
  )
}
