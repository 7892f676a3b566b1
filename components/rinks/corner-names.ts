// What the four corners of a rink are called, in the order of its floor.
export const CORNER_NAMES = ['North corner', 'East corner', 'South corner', 'West corner'] as const
