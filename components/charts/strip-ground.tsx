// Behind the bars: the night, missing hours, the grid, and the patterns that the strip fills with.
import { BarredPattern } from './barred-pattern'
import { FLOOR, type StripPartProps } from './strip-parts'

/** Verdicts differ by pattern first: horizontal bars for fill, a slanted hatch where the forecast is missing. */
export function Patterns({ id }: { id: string }) {
  return (
    <defs>
      <BarredPattern id={`${id}-barred`} />
      <pattern id={`${id}-hatch`} width={6} height={6} patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
        <rect width={1.2} height={6} className="fill-still" />
      </pattern>
    </defs>
  )
}

export function Ground({ id, layout, words }: StripPartProps & { id: string }) {
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
