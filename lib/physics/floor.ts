// The floor of a rink: how water stands on it, from the depths below a level line at its corners.
import { inRange } from './check'

/** Depths of the floor below a level reference (the string line), in row order on a regular grid of at least two by two points. [m] */
export interface FloorGrid {
  lengthM: number
  widthM: number
  depthsM: number[][]
}

/** Pieces each grid cell is cut into along each side, so that a shore line through it is followed. */
const PIECES = 24

/**
 * A floor between four corners.
 *
 * @param lengthM Length. [m], above 0 to 200
 * @param widthM Width. [m], above 0 to 200
 * @param cornersM Floor below the line at the corners, going round: two on one end, two on the other. [m]
 * @returns Grid for the other functions.
 * @throws RangeError for a size out of range or not four corners.
 */
export function floorFromCorners(lengthM: number, widthM: number, cornersM: readonly number[]): FloorGrid {
  inRange('lengthM [m]', lengthM, 0.1, 200)
  inRange('widthM [m]', widthM, 0.1, 200)
  if (cornersM.length !== 4) throw new RangeError(`cornersM must hold four depths, got ${cornersM.length}`)
  const [a, b, c, d] = cornersM as [number, number, number, number]
  return {
    lengthM,
    widthM,
    depthsM: [
      [a, b],
      [d, c],
    ],
  }
}

/** Water at one level. */
export interface Stage {
  /** [m³] */
  volumeM3: number
  /** Share of the floor under water. [0-1] */
  wetShare: number
  /** Deepest water. [m] */
  deepestM: number
}

/**
 * Water that stands on a floor at a level.
 *
 * @param floor Floor.
 * @param levelM Water surface below the reference line (0 is at the line). [m]
 * @returns Volume, wet share and greatest depth.
 *
 * Source: bilinear floor between grid points, summed over small pieces; area times mean depth where no corner is dry.
 */
export function stageAt(floor: FloorGrid, levelM: number): Stage {
  const rows = floor.depthsM.length - 1
  const columns = floor.depthsM[0]!.length - 1
  const pieceM2 = (floor.lengthM * floor.widthM) / (rows * columns * PIECES * PIECES)
  let volumeM3 = 0
  let wetPieces = 0
  let deepestM = 0
  for (const depth of pieceDepths(floor, rows, columns)) {
    const water = depth - levelM
    if (water <= 0) continue
    volumeM3 += water * pieceM2
    wetPieces += 1
  }
  for (const row of floor.depthsM) for (const depth of row) deepestM = Math.max(deepestM, depth - levelM)
  return { volumeM3, wetShare: wetPieces / (rows * columns * PIECES * PIECES), deepestM }
}

/**
 * Level of a given volume of water.
 *
 * @param floor Floor.
 * @param volumeM3 Water. [m³], 0 or more
 * @returns Level below the reference line; negative when it stands above the line. [m]
 * @throws RangeError for a negative volume.
 */
export function levelOf(floor: FloorGrid, volumeM3: number): number {
  inRange('volumeM3 [m³]', volumeM3, 0, 1e6)
  const depths = floor.depthsM.flat()
  let low = Math.min(...depths) - volumeM3 / (floor.lengthM * floor.widthM) - 1e-6
  let high = Math.max(...depths)
  for (let round = 0; round < 40; round++) {
    const middle = (low + high) / 2
    if (stageAt(floor, middle).volumeM3 > volumeM3) low = middle
    else high = middle
  }
  return (low + high) / 2
}

/**
 * Fill of a floor with the hose, hour by hour.
 *
 * @param floor Floor.
 * @param flowLPerMin Flow. [L/min], above 0 to 2000
 * @param volumeM3 Water wanted. [m³]
 * @returns Stages at full hours and at the end.
 * @throws RangeError for a flow out of range.
 */
export function fillByHour(floor: FloorGrid, flowLPerMin: number, volumeM3: number): { hours: number; stage: Stage }[] {
  inRange('flowLPerMin [L/min]', flowLPerMin, 0.1, 2000)
  const hoursInAll = hoseHours(volumeM3 * 1000, flowLPerMin)
  const steps: number[] = []
  for (let hour = 1; hour < hoursInAll; hour++) steps.push(hour)
  return [...steps, hoursInAll].map((hours) => ({
    hours,
    stage: stageAt(floor, levelOf(floor, (hours * 60 * flowLPerMin) / 1000)),
  }))
}

/** Hours of running hose. @param litres [L] @param flowLPerMin [L/min] @returns [h] */
export function hoseHours(litres: number, flowLPerMin: number): number {
  return litres / inRange('flowLPerMin [L/min]', flowLPerMin, 0.1, 2000) / 60
}

/**
 * Liner for a rink.
 *
 * @param insideM Inside length or width. [m]
 * @param boardM Height of the boards. [m]
 * @param tuckM Down the outside and folds, each side. [m]
 * @returns Liner in that direction: across, up and over both boards, tuck. [m]
 *
 * Source: ours; up and over is common practice.
 */
export function linerLengthM(insideM: number, boardM: number, tuckM: number): number {
  return inRange('insideM [m]', insideM, 0.1, 300) + 2 * (boardM + tuckM)
}

function* pieceDepths(floor: FloorGrid, rows: number, columns: number): Generator<number> {
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) {
      const near = floor.depthsM[row]!
      const far = floor.depthsM[row + 1]!
      for (let i = 0; i < PIECES; i++) {
        const down = (i + 0.5) / PIECES
        const left = near[column]! * (1 - down) + far[column]! * down
        const right = near[column + 1]! * (1 - down) + far[column + 1]! * down
        for (let j = 0; j < PIECES; j++) yield left + ((right - left) * (j + 0.5)) / PIECES
      }
    }
  }
}
