// The floor of a rink: how water stands on it, from the depths below a level line at its corners or on a grid.
import { inRange } from './check'

/** Depths of the floor below a level reference (the string line), in row order on a regular grid of at least two by two points. [m] */
export interface FloorGrid {
  lengthM: number
  widthM: number
  /** Rows follow one another along the length, the points of a row lie across the width. */
  depthsM: number[][]
}

/** A floor as a keeper measures it, below any level line: four corners going round, or a grid of points. [m] */
export type FloorShape = { cornersM: readonly number[] } | { depthsM: readonly (readonly number[])[] }

/** Deepest and highest floor against the line. [m] A rink with more fall than this is no rink. */
const LINE_RANGE_M = 5
/** Points along one side of a grid: more than anybody measures. */
const MOST_POINTS = 50

/**
 * A floor between four corners.
 *
 * @param lengthM Length. [m], above 0 to 500
 * @param widthM Width. [m], above 0 to 500
 * @param cornersM Floor below the line at the corners, going round: two on one end, two on the other. [m], -5 to 5
 * @returns Grid of depths for the other functions. [m]
 * @throws RangeError for a value out of range or not four corners.
 *
 * Source: bilinear between the corners; ours.
 */
export function floorFromCorners(lengthM: number, widthM: number, cornersM: readonly number[]): FloorGrid {
  if (cornersM.length !== 4) throw new RangeError(`cornersM must hold four depths, got ${cornersM.length}`)
  const [a, b, c, d] = cornersM as [number, number, number, number]
  return floorFromGrid(lengthM, widthM, [
    [a, b],
    [d, c],
  ])
}

/**
 * A floor measured on a grid, first and last points on the boards.
 *
 * @param lengthM Length. [m], above 0 to 500
 * @param widthM Width. [m], above 0 to 500
 * @param depthsM Floor below the line, rows along the length. [m], -5 to 5; 2 by 2 to 50 by 50 points, rows alike
 * @returns Grid of depths for the other functions. [m]
 * @throws RangeError for a value out of range or rows that differ in length.
 *
 * Source: as measured.
 */
export function floorFromGrid(lengthM: number, widthM: number, depthsM: readonly (readonly number[])[]): FloorGrid {
  inRange('lengthM [m]', lengthM, 0.1, 500)
  inRange('widthM [m]', widthM, 0.1, 500)
  const columns = depthsM[0]?.length ?? 0
  inRange('rows of depthsM', depthsM.length, 2, MOST_POINTS)
  inRange('points in a row of depthsM', columns, 2, MOST_POINTS)
  for (const row of depthsM) {
    if (row.length !== columns) throw new RangeError(`rows of depthsM must be alike, got ${columns} and ${row.length}`)
    for (const depth of row) inRange('depthsM [m]', depth, -LINE_RANGE_M, LINE_RANGE_M)
  }
  return { lengthM, widthM, depthsM: depthsM.map((row) => [...row]) }
}

/**
 * The floor of a rink as measured; level ground when nothing was.
 *
 * @param lengthM Length. [m], above 0 to 500
 * @param widthM Width. [m], above 0 to 500
 * @param shape Corners or a grid of depths below the line [m], -5 to 5; null when not measured.
 * @returns Grid of depths. [m]
 * @throws RangeError as floorFromCorners and floorFromGrid.
 *
 * Source: as measured.
 */
export function floorOf(lengthM: number, widthM: number, shape?: FloorShape | null): FloorGrid {
  if (!shape) return floorFromCorners(lengthM, widthM, [0, 0, 0, 0])
  if ('cornersM' in shape) return floorFromCorners(lengthM, widthM, shape.cornersM)
  return floorFromGrid(lengthM, widthM, shape.depthsM)
}

/**
 * Floor below the line at the four corners, going round as in floorFromCorners.
 *
 * @param floor Floor.
 * @returns Depths. [m]
 *
 * Source: as measured.
 */
export function cornerDepthsM({ depthsM }: FloorGrid): [number, number, number, number] {
  const first = depthsM[0]!
  const last = depthsM[depthsM.length - 1]!
  return [first[0]!, first[first.length - 1]!, last[last.length - 1]!, last[0]!]
}

/**
 * The highest and the lowest point of the floor, below the line.
 *
 * @param floor Floor.
 * @returns Least and greatest depth below the line. [m]
 *
 * Source: as measured.
 */
export function floorExtremesM({ depthsM }: FloorGrid): { highestM: number; lowestM: number } {
  let highestM = Number.POSITIVE_INFINITY
  let lowestM = Number.NEGATIVE_INFINITY
  for (const row of depthsM) {
    for (const depth of row) {
      highestM = Math.min(highestM, depth)
      lowestM = Math.max(lowestM, depth)
    }
  }
  return { highestM, lowestM }
}
