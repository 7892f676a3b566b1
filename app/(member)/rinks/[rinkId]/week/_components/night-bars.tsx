// A night's bars, small. What they show stands beside them in words, so readers without sight miss nothing.
import type { WeekNight } from '@/lib/schemas/week-view'
import { BAR_FRAME, barsOf, placeOf, type Bar, type BarScale } from './bar-scale'

export function NightBars({ night, scale, className }: { night: WeekNight; scale: BarScale; className: string }) {
  const { width, height, baseline } = BAR_FRAME
  const dark = {
    from: night.sunsetAt ? placeOf(night, night.sunsetAt) : 0,
    to: night.sunriseAt ? placeOf(night, night.sunriseAt) : width,
  }
  return (
    <svg viewBox={`0 0 ${width} ${height}`} className={className} aria-hidden="true">
      {night.sunsetAt || night.sunriseAt ? (
        <rect x={dark.from} y={0} width={dark.to - dark.from} height={height} className="fill-night" />
      ) : null}
      {barsOf(night, scale).map((bar) => (
        <HourBar key={bar.x} bar={bar} />
      ))}
      <path d={`M0,${baseline} H${width}`} className="stroke-graphite" />
    </svg>
  )
}

function HourBar({ bar: { x, y, width, height, verdict, isCut } }: { bar: Bar }) {
  const line = { fill: 'none', strokeWidth: 1 }
  if (isCut) return <path d={`M${x},${y} v${height} m${width},0 v${-height}`} {...line} className="stroke-still" />
  if (verdict === 'flood')
    return <rect x={x} y={y} width={width} height={height} className="fill-lamp stroke-lamp-text" />
  if (verdict === 'hold') return <rect x={x} y={y} width={width} height={height} {...line} className="stroke-still" />
  const bars = Array.from({ length: Math.floor(height / 4) + 1 }, (_, step) => y + height - 1 - step * 4)
  return (
    <g className="stroke-hose">
      <rect x={x} y={y} width={width} height={height} {...line} />
      {bars.map((at) => (
        <path key={at} d={`M${x},${at} h${width}`} strokeWidth={1.6} />
      ))}
    </g>
  )
}
