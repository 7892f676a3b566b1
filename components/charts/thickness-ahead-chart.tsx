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

const TEXT = { fontSize: 12, fill: 'var(--graphite)' }
/** A tick where a day begins: every eighth of the three-hour steps. */
const DAY_STEPS = 8

export default function ThicknessAheadChart({ points, carries, unit }: Props) {
  const dayOf = new Map(points.map(({ when, day }) => [when, day]))
  return (
    <ResponsiveContainer width="100%" height="100%">
      <ComposedChart data={points} margin={{ top: 12, right: 8, bottom: 0, left: 0 }} accessibilityLayer={false}>
        <CartesianGrid vertical={false} stroke="var(--rule)" />
        <XAxis
          dataKey="when"
          ticks={points.filter((_, index) => index % DAY_STEPS === 0).map(({ when }) => when)}
          tickFormatter={(when: string) => dayOf.get(when) ?? ''}
          tick={TEXT}
          tickLine={false}
          axisLine={{ stroke: 'var(--graphite)' }}
        />
        <YAxis
          width={40}
          tick={TEXT}
          tickLine={false}
          axisLine={false}
          domain={[0, (most: number) => Math.ceil(Math.max(most, carries * 1.1))]}
        />
        <Tooltip
          isAnimationActive={false}
          contentStyle={{
            background: 'var(--sheet)',
            border: '1px solid var(--graphite)',
            borderRadius: 4,
            fontSize: 13,
          }}
          labelStyle={{ color: 'var(--ink)' }}
          itemStyle={{ color: 'var(--ink)' }}
        />
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
        <Line
          dataKey="middle"
          name="middle"
          unit={` ${unit}`}
          stroke="var(--ink)"
          strokeWidth={1.8}
          dot={false}
          activeDot={false}
          isAnimationActive={false}
        />
        <ReferenceLine y={carries} stroke="var(--rust)" strokeDasharray="6 4" />
      </ComposedChart>
    </ResponsiveContainer>
  )
}
