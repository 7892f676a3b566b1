// Stage and storage: how much water stands on a floor at a level, and at what level a volume of water stands.
import { inRange } from './check'
import { floorExtremesM, type FloorGrid } from './floor'

/** Pieces along each side that a floor between four corners is cut into; a measured grid needs fewer for each of its cells. */
const PIECES = 12
/** Newton's steps: it gains digits so fast that a dozen are plenty. */
const MOST_STEPS = 60

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
 * @returns Volume [m³], wet share [0-1] and greatest depth [m].
 *
 * Source: prisms over triangles: each piece of the grid is four triangles about its middle, exact for a plane floor
 * with any shore line, and for the bilinear floor between points wherever it is all wet.
 */
export function stageAt(floor: FloorGrid, levelM: number): Stage {
  const rows = floor.depthsM.length - 1
  const columns = floor.depthsM[0]!.length - 1
  const pieces = Math.max(1, Math.ceil(PIECES / Math.sqrt(rows * columns)))
  const triangleM2 = (floor.lengthM * floor.widthM) / (rows * columns * pieces * pieces * 4)
  const sum = { volume: 0, area: 0 }
  for (let row = 0; row < rows; row++) {
    for (let column = 0; column < columns; column++) addCell(sum, floor.depthsM, row, column, pieces, levelM)
  }
  return {
    volumeM3: sum.volume * triangleM2,
    wetShare: Math.min(1, sum.area / (rows * columns * pieces * pieces * 4)),
    deepestM: Math.max(0, floorExtremesM(floor).lowestM - levelM),
  }
}

/**
 * Level of a given volume of water.
 *
 * @param floor Floor.
 * @param volumeM3 Water. [m³], 0 to 1e6
 * @returns Level below the reference line; negative when it stands above the line. [m]
 * @throws RangeError for a volume out of range.
 *
 * Source: Newton's method. The volume grows with the level at the rate of the wet area, so from the side of too much
 * water it closes in without overshooting.
 */
export function levelOf(floor: FloorGrid, volumeM3: number): number {
  inRange('volumeM3 [m³]', volumeM3, 0, 1e6)
  const { highestM, lowestM } = floorExtremesM(floor)
  if (volumeM3 === 0) return lowestM
  const areaM2 = floor.lengthM * floor.widthM
  const brimM3 = stageAt(floor, highestM).volumeM3
  if (volumeM3 >= brimM3) return highestM - (volumeM3 - brimM3) / areaM2
  let level = highestM
  for (let step = 0; step < MOST_STEPS; step++) {
    const stage = stageAt(floor, level)
    const tooMuchM3 = stage.volumeM3 - volumeM3
    if (tooMuchM3 <= 1e-9 * volumeM3 || stage.wetShare === 0) break
    level = Math.min(lowestM, level + tooMuchM3 / (stage.wetShare * areaM2))
  }
  return level
}

/**
 * Fill of a floor with the hose, hour by hour.
 *
 * @param floor Floor.
 * @param flowLPerMin Flow. [L/min], above 0 to 2000
 * @param volumeM3 Water wanted. [m³]
 * @returns Time [h], level below the line [m] and stage at full hours and at the end.
 * @throws RangeError for a flow out of range.
 *
 * Source: balance of volume, levelOf.
 */
export function fillByHour(
  floor: FloorGrid,
  flowLPerMin: number,
  volumeM3: number,
): { hours: number; levelM: number; stage: Stage }[] {
  const hoursInAll = hoseHours(volumeM3 * 1000, flowLPerMin)
  const steps: number[] = []
  for (let hour = 1; hour < hoursInAll; hour++) steps.push(hour)
  return [...steps, hoursInAll].map((hours) => {
    const levelM = levelOf(floor, (hours * 60 * flowLPerMin) / 1000)
    return { hours, levelM, stage: stageAt(floor, levelM) }
  })
}

/**
 * Hours of running hose.
 *
 * @param litres Water. [L]
 * @param flowLPerMin Flow. [L/min], 0.1 to 2000
 * @returns Time. [h]
 * @throws RangeError for a flow out of range.
 *
 * Source: definition.
 */
export function hoseHours(litres: number, flowLPerMin: number): number {
  return litres / inRange('flowLPerMin [L/min]', flowLPerMin, 0.1, 2000) / 60
}

interface Sum {
  volume: number
  area: number
}

function addCell(sum: Sum, depths: number[][], row: number, column: number, pieces: number, levelM: number): void {
  const near = [depths[row]![column]! - levelM, depths[row]![column + 1]! - levelM] as const
  const far = [depths[row + 1]![column]! - levelM, depths[row + 1]![column + 1]! - levelM] as const
  const depthAt = (down: number, across: number) =>
    (near[0] * (1 - across) + near[1] * across) * (1 - down) + (far[0] * (1 - across) + far[1] * across) * down
  for (let i = 0; i < pieces; i++) {
    for (let j = 0; j < pieces; j++) {
      const a = depthAt(i / pieces, j / pieces)
      const b = depthAt(i / pieces, (j + 1) / pieces)
      const c = depthAt((i + 1) / pieces, (j + 1) / pieces)
      const d = depthAt((i + 1) / pieces, j / pieces)
      const middle = (a + b + c + d) / 4
      addTriangle(sum, a, b, middle)
      addTriangle(sum, b, c, middle)
      addTriangle(sum, c, d, middle)
      addTriangle(sum, d, a, middle)
    }
  }
}

/** Adds the wet part of a triangle of area 1 with water this deep over its corners (negative is dry). */
function addTriangle(sum: Sum, a: number, b: number, c: number): void {
  const high = Math.max(a, b, c)
  const low = Math.min(a, b, c)
  if (high <= 0) return
  const all = a + b + c
  if (low >= 0) {
    sum.area += 1
    sum.volume += all / 3
    return
  }
  const between = all - high - low
  if (between <= 0) {
    const share = (high / (high - low)) * (high / (high - between))
    sum.area += share
    sum.volume += (share * high) / 3
    return
  }
  const dryShare = (low / (low - high)) * (low / (low - between))
  sum.area += 1 - dryShare
  sum.volume += (all - dryShare * low) / 3
}
