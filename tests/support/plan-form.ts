// What people type into the building plan, as its form sends it.

/** A level rink of 10 m by 10 m under 10 cm of water, unless `changes` says otherwise. */
export function planForm(changes: Record<string, string> = {}): Record<string, string> {
  return {
    units: 'metric',
    length: '10',
    width: '10',
    floorKind: 'level',
    leastDepth: '10',
    flow: '25',
    bucketSize: '',
    bucketSeconds: '',
    hoursInOneGo: '6',
    waterPrice: '',
    boardHeight: '',
    freeboard: '5',
    season: '2026',
    ...changes,
  }
}
