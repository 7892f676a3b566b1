// The night strip as plain SVG: readable before any script runs. All positions come from night-strip-layout.ts.
import { memo } from 'react'
import type { StripBar, StripLayout } from './night-strip-layout'
import { Ground, Patterns } from './strip-ground'
import { Floor, Now, Passes } from './strip-marks'
import type { StripPartProps } from './strip-parts'

const TEXT = 12

interface DrawingProps extends StripPartProps {
  id: string
  /** Apart from the layout, so that a moved pass draws nothing else anew. */
  brackets?: StripLayout['brackets']
}

export function NightStripDrawing({ id, layout, words, brackets = layout.brackets }: DrawingProps) {
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
      <SteadyParts id={id} layout={layout} words={words} />
      <Passes layout={layout} words={words} brackets={brackets} />
      <Now layout={layout} word={words.now} />
    </svg>
  )
}

const SteadyParts = memo(function SteadyParts({ id, layout, words }: StripPartProps & { id: string }) {
  const { frame } = layout
  return (
    <>
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
    </>
  )
})

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
function AirLine({ layout, words }: StripPartProps) {
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
