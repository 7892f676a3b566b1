// One bar for each night or week. Loaded on demand (recharts is heavy).
'use client'
import { Bar, BarChart, CartesianGrid, ResponsiveContainer, Tooltip, XAxis, YAxis } from 'recharts'
import { AXIS, FLOOR, TIP } from '@/components/charts/chart-parts'

interface BarsChartProps {
  bars: { day: string; value: number }[]
  name: string
  unit: string
  look: 'water' | 'nights'
}

const LOOKS = { water: { fill: 'var(--hose)' }, nights: { fill: 'var(--lamp)', stroke: 'var(--lamp-text)' } }

export default function BarsChart({ bars, name, unit, look }: BarsChartProps) {
  return (
    <ResponsiveContainer width="100%" height="100%">
      <BarChart data={bars} margin={{ top: 12, right: 4, bottom: 0, left: 0 }} accessibilityLayer={false}>
        <CartesianGrid vertical={false} stroke="var(--rule)" />
        <XAxis dataKey="day" {...AXIS} {...FLOOR} />
        <YAxis width={44} {...AXIS} axisLine={false} allowDecimals={false} />
        <Tooltip {...TIP} cursor={{ fill: 'var(--night)' }} />
        <Bar
          dataKey="value"
          name={name}
          unit={unit ? ` ${unit}` : ''}
          maxBarSize={34}
          isAnimationActive={false}
          {...LOOKS[look]}
        />
      </BarChart>
    </ResponsiveContainer>
  )
}
