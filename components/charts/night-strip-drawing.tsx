// The night strip as plain SVG: readable before any script runs. All positions come from night-strip-layout.ts.
import type { StripBar, StripLayout } from './night-strip-layout'
import type { PlacedLabel } from './strip-labels'

export interface StripWords {
  title: string
  description: string
  hourTicks: PlacedLabel[]
  amounts: PlacedLabel[]
  rateLabel: (value: number) => string
  airLabel: (value: number) => string
  passLabel: (number: number, width: number) => string
  now: string
  gap: string
}

const TEXT = 12

export function NightStripDrawing({ id, layout, words }: { id: string; layout: StripLayout; words: StripWords }) {
  const { frame } = layout
  return (
    <svg
      viewBox={`0 0 ${frame.width} ${frame.height}`}
      role="img"
      aria-labelledby={`${id}-title`}
      aria-describedby={`${id}-description`}
      className="block h-auto w-full"
      fontSize={TEXT}
    >
      <title id={`${id}-title`}>{words.title}</title>
      <desc id={`${id}-description`}>{words.description}</desc>
      <Patterns id={id} />
      <Ground id={id} layout={layout} words={words} />
      {layout.bars.map((bar) => (
        <Bar key={bar.index} bar={bar} barred={`url(#${id}-barred)`} />
      ))}
      <line
        x1={frame.left}
        x2={frame.width - frame.right}
        y1={layout.baselineY}
        y2={layout.baselineY}
        className="stroke-graphite"
        strokeWidth={1.2}
      />
      {layout.openSpans.map(({ x, width }) => (
        <line
          key={x}
          x1={x}
          x2={x + width}
          y1={layout.baselineY}
          y2={layout.baselineY}
          className="stroke-ink"
          strokeWidth={4}
        />
      ))}
      <AirLine layout={layout} words={words} />
      <Floor layout={layout} words={words} />
      <Passes layout={layout} words={words} />
      <Now layout={layout} word={words.now} />
    </svg>
  )
}

/** Verdicts differ by pattern first: horizontal bars for fill, a slanted hatch where the forecast is missing. */
function Patterns({ id }: { id: string }) {
  return (
    <defs>
      <pattern id={`${id}-barred`} width={4} height={4} patternUnits="userSpaceOnUse">
        <rect width={4} height={1.8} className="fill-hose" />
      </pattern>
      <pattern id={`${id}-hatch`} width={6} height={6} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
        <rect width={1.2} height={6} className="fill-still" />
      </pattern>
    </defs>
  )
}

function Ground({ id, layout, words }: { id: string; layout: StripLayout; words: StripWords }) {
  const { frame, night } = layout
  const floorHeight = frame.plotBottom - frame.plotTop + FLOOR.ground
  return (
    <g>
      {night ? (
        <rect x={night.x} y={frame.plotTop} width={night.width} height={floorHeight} className="fill-night" />
      ) : null}
      {layout.gaps.map(({ x, width }) => (
        <g key={x}>
          <rect
            x={x}
            y={frame.plotTop}
            width={width}
            height={frame.plotBottom - frame.plotTop}
            fill={`url(#${id}-hatch)`}
          />
          {width > words.gap.length * 6.5 ? (
            <GapWord x={x + width / 2} y={frame.plotTop + 24} word={words.gap} />
          ) : null}
        </g>
      ))}
      {layout.rateTicks.map(({ value, y }) => (
        <g key={value}>
          {value === 0 ? null : (
            <line x1={frame.left} x2={frame.width - frame.right} y1={y} y2={y} className="stroke-rule" />
          )}
          <text x={frame.left - 8} y={y + 4} textAnchor="end" className="fill-graphite">
            {words.rateLabel(value)}
          </text>
        </g>
      ))}
    </g>
  )
}

function GapWord({ x, y, word }: { x: number; y: number; word: string }) {
  const width = word.length * 6.5 + 8
  return (
    <>
      <rect x={x - width / 2} y={y - 13} width={width} height={19} className="fill-sheet" />
      <text x={x} y={y} textAnchor="middle" className="fill-graphite">
        {word}
      </text>
    </>
  )
}

function Bar({ bar, barred }: { bar: StripBar; barred: string }) {
  const { x, y, width, height, verdict } = bar
  if (bar.isCut)
    return (
      <path
        d={`M${x},${y} v${height} m${width},0 v${-height}`}
        fill="none"
        className="stroke-still"
        strokeWidth={1.3}
      />
    )
  if (verdict === 'flood')
    return <rect x={x} y={y} width={width} height={height} className="fill-lamp stroke-lamp-text" />
  if (verdict === 'fill')
    return <rect x={x} y={y} width={width} height={height} fill={barred} className="stroke-hose" />
  return <rect x={x} y={y} width={width} height={height} fill="none" className="stroke-still" strokeWidth={1.3} />
}

/** The line has a casing in the colour of the sheet, so that it stays visible across solid bars in both themes. */
function AirLine({ layout, words }: { layout: StripLayout; words: StripWords }) {
  const { frame, airLines, airTicks } = layout
  const line = { fill: 'none', strokeLinejoin: 'round', strokeLinecap: 'round' } as const
  return (
    <g>
      {airLines.map((points) => (
        <g key={points}>
          <polyline points={points} {...line} className="stroke-sheet" strokeWidth={4.6} />
          <polyline points={points} {...line} className="stroke-ink" strokeWidth={1.8} />
        </g>
      ))}
      {airTicks.map(({ value, y }) => (
        <text key={value} x={frame.width - frame.right + 8} y={y + 4} className="fill-graphite">
          {words.airLabel(value)}
        </text>
      ))}
    </g>
  )
}

/** Heights under the plot: marks of snow and rain, their amounts, the hours. */
const FLOOR = { ground: 19, marks: 10, amounts: 33, hours: 54 }

function Floor({ layout, words }: { layout: StripLayout; words: StripWords }) {
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

/** From pour to set; a poured pass is a wedge at its pour. */
function Passes({ layout, words }: { layout: StripLayout; words: StripWords }) {
  const top = layout.frame.plotTop - 11
  return (
    <g>
      {layout.brackets.map(({ number, x, width, isPoured }) => (
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
          <text x={isPoured ? x : x + width / 2} y={top - 6} textAnchor="middle" className="fill-ink" fontWeight={500}>
            {words.passLabel(number, isPoured ? 0 : width)}
          </text>
        </g>
      ))}
    </g>
  )
}

function Now({ layout, word }: { layout: StripLayout; word: string }) {
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
