// What all charts drawn by recharts have in common: how axes, lines and tips look.

const TEXT = { fontSize: 12, fill: 'var(--graphite)' }

export const AXIS = { tick: TEXT, tickLine: false } as const

/** The line that the chart stands on. */
export const FLOOR = { axisLine: { stroke: 'var(--graphite)' }, interval: 'equidistantPreserveStart' } as const

export const LINE = { dot: false, activeDot: false, isAnimationActive: false, strokeWidth: 1.8 } as const

export const TIP = {
  isAnimationActive: false,
  contentStyle: { background: 'var(--sheet)', border: '1px solid var(--graphite)', borderRadius: 4, fontSize: 13 },
  labelStyle: { color: 'var(--ink)' },
  itemStyle: { color: 'var(--ink)' },
} as const
