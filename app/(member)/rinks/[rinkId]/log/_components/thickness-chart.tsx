// Ice thickness day by day: the model as a line, what was drilled as marks. Loaded on demand (recharts is heavy).
'use client'
import { CartesianGrid, ComposedChart, Line, ResponsiveContainer, Scatter, Tooltip, XAxis, YAxis } from 'recharts'
import { AXIS, FLOOR, LINE, TIP } from '@/components/charts/chart-parts'

export interface ThicknessPoint {
  day: string
  model: number | null
  measured: number | null
}

export default function ThicknessChart({ days, unit }: { days: ThicknessPoint[]; unit: string }) {
  return (
    <ResponsiveContainer width="100%" height="100%">
      <ComposedChart data={days} margin={{ top: 12, right: 4, bottom: 0, left: 0 }} accessibilityLayer={false}>
        <CartesianGrid vertical={false} stroke="var(--rule)" />
        <XAxis dataKey="day" {...AXIS} {...FLOOR} />
        <YAxis width={40} {...AXIS} axisLine={false} />
        <Tooltip {...TIP} cursor={{ stroke: 'var(--graphite)' }} />
        <Line dataKey="model" name="model" unit={` ${unit}`} stroke="var(--ink)" connectNulls {...LINE} />
        <Scatter
          dataKey="measured"
          name="measured"
          fill="var(--lamp)"
          stroke="var(--ink)"
          shape="diamond"
          isAnimationActive={false}
        />
      </ComposedChart>
    </ResponsiveContainer>
  )
}
