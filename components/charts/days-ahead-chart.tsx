// Ten days ahead: what could freeze each day as bars, low and high of the air as lines. Loaded on demand (recharts is heavy).
'use client'
import { Bar, CartesianGrid, Cell, ComposedChart, Line, ResponsiveContainer, Tooltip, XAxis, YAxis } from 'recharts'
import { AXIS, FLOOR, LINE, TIP } from './chart-parts'

export interface DayColumn {
  day: string
  /** Depth that could freeze, in the reader's unit. */
  freezable: number | null
  low: number | null
  high: number | null
  hasFloodHours: boolean
}

interface DaysAheadChartProps {
  days: DayColumn[]
  depthUnit: string
  airUnit: string
}

const AIR = [{ key: 'high' }, { key: 'low', dash: '4 3' }]
/** Lines lie on a casing, so that they stay visible across solid bars. */
const AIR_LINE = { yAxisId: 'air', ...LINE }

export default function DaysAheadChart({ days, depthUnit, airUnit }: DaysAheadChartProps) {
  return (
    <ResponsiveContainer width="100%" height="100%">
      <ComposedChart data={days} margin={{ top: 12, right: 4, bottom: 0, left: 0 }} accessibilityLayer={false}>
        <CartesianGrid vertical={false} stroke="var(--rule)" />
        <XAxis dataKey="day" {...AXIS} {...FLOOR} />
        <YAxis yAxisId="depth" width={34} {...AXIS} axisLine={false} />
        <YAxis
          yAxisId="air"
          orientation="right"
          width={38}
          {...AXIS}
          axisLine={false}
          tickFormatter={(value: number) => `${value}°`.replace('-', '−')}
        />
        <Tooltip {...TIP} cursor={{ fill: 'var(--night)' }} />
        <Bar
          yAxisId="depth"
          dataKey="freezable"
          name="could freeze"
          unit={` ${depthUnit}`}
          maxBarSize={38}
          isAnimationActive={false}
        >
          {days.map(({ day, hasFloodHours }) =>
            hasFloodHours ? (
              <Cell key={day} fill="var(--lamp)" stroke="var(--lamp-text)" />
            ) : (
              <Cell key={day} fill="transparent" stroke="var(--still)" strokeWidth={1.3} />
            ),
          )}
        </Bar>
        {AIR.map(({ key }) => (
          <Line
            key={`${key}-casing`}
            {...AIR_LINE}
            dataKey={key}
            stroke="var(--paper)"
            strokeWidth={4.6}
            tooltipType="none"
          />
        ))}
        {AIR.map(({ key, dash }) => (
          <Line key={key} {...AIR_LINE} dataKey={key} unit={` ${airUnit}`} stroke="var(--ink)" strokeDasharray={dash} />
        ))}
      </ComposedChart>
    </ResponsiveContainer>
  )
}
