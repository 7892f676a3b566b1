// A night's bars, small. What they show stands beside them in words, so readers without sight miss nothing.
import type { WeekNight } from '@/lib/schemas/week-view'
import { BAR_FRAME, barsOf, placeOf, round, type Bar, type BarScale } from './bar-scale'

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
      <Bars bars={barsOf(night, scale)} />
      <path d={`M0,${baseline} H${width}`} className="stroke-graphite" />
    </svg>
  )
}

/** One figure for all bars of a kind: ten nights of bars one by one would be most of the page. */
function Bars({ bars }: { bars: Bar[] }) {
  const figure = (verdict: Bar['verdict'], draw: (bar: Bar) => string) =>
    bars
      .filter((bar) => bar.verdict === verdict)
      .map(draw)
      .join('')
  return (
    <>
      <path d={figure('hold', outlineOf)} fill="none" className="stroke-still" />
      <path d={figure('flood', outlineOf)} className="fill-lamp stroke-lamp-text" />
      <path d={figure('fill', outlineOf)} fill="none" className="stroke-hose" />
      <path d={figure('fill', barredOf)} className="stroke-hose" strokeWidth={1.6} />
    </>
  )
}

/** A bar that is cut stays open at the side where it goes on. */
function outlineOf({ x, y, width, height, isCut }: Bar): string {
  return isCut ? `M${x},${y}v${height}m${width},0v${-height}` : `M${x},${y}h${width}v${height}h${-width}z`
}

function barredOf({ x, y, width, height }: Bar): string {
  const count = Math.floor(height / 4) + 1
  return Array.from({ length: count }, (_, step) => `M${x},${round(y + height - 1 - step * 4)}h${width}`).join('')
}
