// Boards: how high they must be, and how hard standing water pushes them.
import { inRange } from './check'
import { GRAVITY, ICE_DENSITY, WATER_DENSITY } from './constants'

/**
 * Push of still water on each metre of board.
 *
 * @param depthM Water against the board. [m], 0 to 3
 * @returns Resultant, acting at a third of the depth above the foot. [N/m]
 * @throws RangeError outside the range.
 *
 * Source: hydrostatics, ½ ρ g h².
 */
export function waterPushNPerM(depthM: number): number {
  return 0.5 * WATER_DENSITY * GRAVITY * inRange('depthM [m]', depthM, 0, 3) ** 2
}

/**
 * Moment of that push about the foot of the board: what a stake or brace has to hold.
 *
 * @param depthM Water against the board. [m], 0 to 3
 * @returns Moment on each metre of board. [N m/m]
 * @throws RangeError outside the range.
 *
 * Source: hydrostatics, the resultant ½ ρ g h² at h/3, so ρ g h³ / 6.
 */
export function footMomentNmPerM(depthM: number): number {
  return (waterPushNPerM(depthM) * depthM) / 3
}

/**
 * How much higher the same water stands once it is ice.
 *
 * @param depthM Water. [m], 0 to 3
 * @returns Rise of the surface. [m]
 * @throws RangeError outside the range.
 *
 * Source: water at 0 °C, 1000 kg/m³, becomes ice of 916.7 kg/m³ (IAPWS R10-06); between boards it can only go up.
 */
export function freezingRiseM(depthM: number): number {
  return inRange('depthM [m]', depthM, 0, 3) * (WATER_DENSITY / ICE_DENSITY - 1)
}

/**
 * Height of board wanted over the floor at a place.
 *
 * @param waterM Water there. [m], 0 to 3 (negative counts as dry)
 * @param freeboardM Board above the water. [m], 0 to 1; it has to take the rise on freezing and the floods of a season
 * @returns Height. [m]
 * @throws RangeError outside the ranges.
 *
 * Source: definition.
 */
export function boardHeightM(waterM: number, freeboardM: number): number {
  return inRange('waterM [m]', Math.max(0, waterM), 0, 3) + inRange('freeboardM [m]', freeboardM, 0, 1)
}

/** Dressed height of nominal lumber. [m] American Softwood Lumber Standard PS 20: 5½, 7¼, 9¼ and 11¼ inches; from memory. */
const LUMBER: readonly (readonly [name: string, heightM: number])[] = [
  ['2×6', 0.1397],
  ['2×8', 0.18415],
  ['2×10', 0.23495],
  ['2×12', 0.28575],
]

/**
 * The lowest board, or pair of boards one on the other, of nominal lumber that is high enough.
 *
 * @param heightM Height wanted. [m]
 * @returns Names from the bottom up and their height together [m]; null when no pair reaches.
 *
 * Source: dressed sizes above; a narrow board on a wide one at the low corner is common practice.
 */
export function lumberFor(heightM: number): { boards: string[]; heightM: number } | null {
  const single = LUMBER.map(([name, height]) => ({ boards: [name], heightM: height }))
  const pairs = LUMBER.flatMap(([lower, lowerM], index) =>
    LUMBER.slice(0, index + 1).map(([upper, upperM]) => ({ boards: [lower, upper], heightM: lowerM + upperM })),
  )
  const enough = [...single, ...pairs].filter((stack) => stack.heightM >= heightM - 1e-9)
  return enough.sort((a, b) => a.boards.length - b.boards.length || a.heightM - b.heightM)[0] ?? null
}
