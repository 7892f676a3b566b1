// What the log's charts have in common: how axes and tips are written.

export const TEXT = { fontSize: 12, fill: 'var(--graphite)' }

export const AXIS = { tick: TEXT, tickLine: false } as const

export const TIP = {
  isAnimationActive: false,
  contentStyle: { background: 'var(--sheet)', border: '1px solid var(--graphite)', borderRadius: 4, fontSize: 13 },
  labelStyle: { color: 'var(--ink)' },
  itemStyle: { color: 'var(--ink)' },
} as const
