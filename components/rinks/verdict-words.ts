// The words of the verdicts of an hour, for legend, table and panel.

export const VERDICT_WORDS = { flood: 'flood', fill: 'fill', hold: 'hold off' } as const
