// The cut from the high to the low corner: ground, boards, liner and water, each told apart by its pattern and its label.
import type { BuildSums } from '@/lib/advice/build-types'
import { layOutCut, NARROW, WIDE, type CutSize } from './cross-section-layout'

export interface CutLabels {
  /** For screen readers: everything the drawing shows. */
  description: string
  waterLine: string
  high: string
  low: string
  push: string
  fall: string
}

type Sums = Pick<BuildSums, 'section' | 'water' | 'boards'>

const TEXT = 'fill-ink text-small'

export function CrossSection({ sums, labels }: { sums: Sums; labels: CutLabels }) {
  return (
    <>
      <Drawing sums={sums} labels={labels} size={WIDE} className="hidden lg:block print:block" />
      <Drawing sums={sums} labels={labels} size={NARROW} className="lg:hidden print:hidden" />
    </>
  )
}

function Drawing({
  sums,
  labels,
  size,
  className,
}: {
  sums: Sums
  labels: CutLabels
  size: CutSize
  className: string
}) {
  const cut = layOutCut(sums, size)
  const { left, right, levelY, boardTopY, highFootY, lowFootY } = cut
  const isNarrow = size === NARROW
  const pattern = isNarrow ? 'cut-water-narrow' : 'cut-water-wide'
  return (
    <svg
      viewBox={`0 0 ${size.width} ${size.height}`}
      role="img"
      aria-label={labels.description}
      className={`h-auto w-full ${className}`}
    >
      <defs>
        <pattern id={pattern} width="6" height="6" patternUnits="userSpaceOnUse">
          <rect width="6" height="1.4" className="fill-hose" />
        </pattern>
      </defs>
      <path d={cut.ground} className="fill-night stroke-graphite" />
      <path d={cut.water} fill={`url(#${pattern})`} fillOpacity="0.55" />
      <line x1={left} x2={right} y1={levelY} y2={levelY} strokeWidth="2" className="stroke-hose" />
      <Board x={left - 12} topY={boardTopY} footY={highFootY} />
      <Board x={right} topY={boardTopY} footY={lowFootY} />
      <path d={cut.liner} fill="none" strokeWidth="1.4" strokeDasharray="5 3" className="stroke-ink" />
      <text x={left + 14} y={levelY - 6} className={TEXT}>
        {labels.waterLine}
      </text>
      <Labels labels={labels} cut={cut} isNarrow={isNarrow} />
    </svg>
  )
}

function Board({ x, topY, footY }: { x: number; topY: number; footY: number }) {
  return <rect x={x} y={topY} width="12" height={Math.max(4, footY - topY + 10)} className="fill-graphite" />
}

/** On a phone the two ends stand one above the other. */
function Labels({
  labels,
  cut,
  isNarrow,
}: {
  labels: CutLabels
  cut: ReturnType<typeof layOutCut>
  isNarrow: boolean
}) {
  const { size, boardTopY } = cut
  const y = boardTopY - 16
  const edge = isNarrow ? 4 : 40
  return (
    <>
      <text x={edge} y={isNarrow ? y - 38 : y} className={TEXT}>
        {labels.high}
      </text>
      <text x={size.width - edge} y={isNarrow ? y - 19 : y - 18} textAnchor="end" className={TEXT}>
        {labels.low}
      </text>
      <text x={size.width - edge} y={y} textAnchor="end" className={TEXT}>
        {labels.push}
      </text>
      <text x={size.width / 2} y={size.height - 12} textAnchor="middle" className={TEXT}>
        {labels.fall}
      </text>
    </>
  )
}
