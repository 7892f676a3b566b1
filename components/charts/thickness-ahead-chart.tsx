// Ice ahead: the middle run as a line in the band of the others, against what carries a skater. Loaded on demand (recharts is heavy).
'use client'
import {
  Area,
  CartesianGrid,
  ComposedChart,
  Line,
  ReferenceLine,
  ResponsiveContainer,
  Tooltip,
  XAxis,
  YAxis,
} from 'recharts'
import { AXIS, FLOOR, LINE, TIP } from './chart-parts'

export interface ThicknessPoint {
  when: string
  day: string
  middle: number
  spread: [number, number]
}

interface Props {
  points: ThicknessPoint[]
  carries: number
  unit: string
}

/** A tick for each day: every eighth of the three-hour steps. */
const DAY_STEPS = 8
/** Distances of the lines, in the reader's unit: the first that needs no more than five. */
const NICE = [0.5, 1, 2, 2.5, 5, 10, 20, 50]

export default function ThicknessAheadChart({ points, carries, unit }: Props) {
  const rows = points.map((point, step) => ({ ...point, step }))
  const most = Math.max(carries * 1.1, ...points.map(({ spread }) => spread[1]))
  const between = NICE.find((step) => most / step <= 5) ?? most
  return (
    <ResponsiveContainer width="100%" height="100%">
      <ComposedChart data={rows} margin={{ top: 12, right: 8, bottom: 0, left: 0 }} accessibilityLayer={false}>
        <CartesianGrid vertical={false} stroke="var(--rule)" />
        <XAxis
          dataKey="step"
          type="number"
          domain={[0, Math.max(1, points.length - 1)]}
          ticks={rows.filter(({ step }) => step % DAY_STEPS === 0).map(({ step }) => step)}
          tickFormatter={(step: number) => points[step]?.day ?? ''}
          {...AXIS}
          {...FLOOR}
        />
        <YAxis
          width={40}
          {...AXIS}
          axisLine={false}
          domain={[0, Math.ceil(most / between) * between]}
          ticks={Array.from({ length: Math.ceil(most / between) + 1 }, (_, line) => line * between)}
        />
        <Tooltip {...TIP} labelFormatter={(step) => points[Number(step)]?.when ?? ''} />
        <Area
          dataKey="spread"
          name="eight of ten runs"
          unit={` ${unit}`}
          fill="var(--hose)"
          fillOpacity={0.22}
          stroke="var(--hose)"
          strokeWidth={1}
          isAnimationActive={false}
          activeDot={false}
        />
        <Line dataKey="middle" name="middle" unit={` ${unit}`} stroke="var(--ink)" {...LINE} />
        <ReferenceLine y={carries} stroke="var(--rust)" strokeDasharray="6 4" />
      </ComposedChart>
    </ResponsiveContainer>
  )
}
