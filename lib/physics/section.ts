// A cut through the floor from its highest to its lowest point, for the drawing.
import type { FloorGrid } from './floor'

const POINTS = 25

export interface SectionPoint {
  /** From the highest point. [m] */
  alongM: number
  /** Floor below the line. [m] */
  floorM: number
}

/**
 * Floor at a place, between the points of the grid.
 *
 * @param floor Floor.
 * @param lengthShare Along the length from the first row. [0-1]
 * @param widthShare Across the width from the first column. [0-1]
 * @returns Floor below the line. [m]
 *
 * Source: bilinear.
 */
export function floorDepthM({ depthsM }: FloorGrid, lengthShare: number, widthShare: number): number {
  const [row, down] = cellOf(lengthShare, depthsM.length)
  const [column, across] = cellOf(widthShare, depthsM[0]!.length)
  const along = (line: readonly number[]) => line[column]! * (1 - across) + line[column + 1]! * across
  return along(depthsM[row]!) * (1 - down) + along(depthsM[row + 1]!) * down
}

function cellOf(share: number, points: number): [index: number, fraction: number] {
  const position = Math.min(1, Math.max(0, share)) * (points - 1)
  const index = Math.min(points - 2, Math.floor(position))
  return [index, position - index]
}

/**
 * The cut from the highest measured point to the lowest; on level ground along the length.
 *
 * @param floor Floor.
 * @returns Points at equal distances along the cut, the highest first: distance and floor below the line. [m]
 *
 * Source: bilinear, floorDepthM.
 */
export function highToLowSection(floor: FloorGrid): SectionPoint[] {
  const [from, to] = ends(floor)
  const lengthM = Math.hypot((to[0] - from[0]) * floor.lengthM, (to[1] - from[1]) * floor.widthM)
  return Array.from({ length: POINTS }, (_, index) => {
    const share = index / (POINTS - 1)
    const floorM = floorDepthM(floor, from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share)
    return { alongM: lengthM * share, floorM }
  })
}

type Place = readonly [lengthShare: number, widthShare: number]

function ends({ depthsM }: FloorGrid): [Place, Place] {
  const rows = depthsM.length - 1
  const columns = depthsM[0]!.length - 1
  let high: [row: number, column: number] = [0, 0]
  let low: [row: number, column: number] = [0, 0]
  for (let row = 0; row <= rows; row++) {
    for (let column = 0; column <= columns; column++) {
      const depth = depthsM[row]![column]!
      if (depth < depthsM[high[0]]![high[1]]!) high = [row, column]
      if (depth > depthsM[low[0]]![low[1]]!) low = [row, column]
    }
  }
  if (high[0] === low[0] && high[1] === low[1])
    return [
      [0, 0],
      [1, 0],
    ]
  return [
    [high[0] / rows, high[1] / columns],
    [low[0] / rows, low[1] / columns],
  ]
}
