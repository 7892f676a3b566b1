// What can be chosen for a rink, and where a form starts. No zod in here: the form's own code reads it too.

export const BASES = ['liner', 'ground', 'snow'] as const
export const SHELTERS = ['open', 'suburban', 'tight'] as const
export const SKIES = ['wide', 'edged', 'yard', 'closed-in'] as const
export const PHASES = ['planning', 'waiting', 'filling', 'freezing', 'skating', 'thaw', 'closed'] as const
export const FLOOR_KINDS = ['level', 'corners', 'grid'] as const
export const WATER_KINDS = ['cold-tap', 'hot-tap', 'hydrant', 'tanker'] as const

export type SkyChoice = (typeof SKIES)[number]

/** Share of the sky dome that is open, by what a keeper sees. The factors are ours, guessed from angles of houses and trees. */
export const SKY_VIEWS: Record<SkyChoice, number> = { wide: 0.95, edged: 0.85, yard: 0.65, 'closed-in': 0.45 }

/**
 * What a source gives when nobody measured it. Ours; the cold ones near the 3-6 °C of Fox Point's mains in winter and
 * below the 13 °C of Shorewood's well, hose flows as of an ordinary garden tap.
 */
export const WATER_DEFAULTS: Record<(typeof WATER_KINDS)[number], { flowLPerMin: number; temperatureC: number }> = {
  'cold-tap': { flowLPerMin: 20, temperatureC: 6 },
  'hot-tap': { flowLPerMin: 12, temperatureC: 45 },
  hydrant: { flowLPerMin: 200, temperatureC: 5 },
  tanker: { flowLPerMin: 200, temperatureC: 5 },
}

/** Where a form starts. 3 mm a pass and 10 cm of water on a liner are what Truro News gives; the rest is ours. */
export const RINK_DEFAULTS = {
  sideM: 10,
  layerMm: 3,
  fillDepthMm: 100,
  from: '17:00',
  to: '23:00',
  maxPasses: 3,
  tellAt: '15:30',
}

/** Phases in which there is ice whose thickness matters. */
export function hasIce(phase: (typeof PHASES)[number]): boolean {
  return phase === 'freezing' || phase === 'skating' || phase === 'thaw'
}
