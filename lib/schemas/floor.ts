// The floor of a rink as a keeper measured it: how far the ground lies below its highest point. Null is level ground.
import { z } from 'zod'
import type { FloorShape } from '@/lib/physics/floor'
import type { Units } from '@/lib/units'
import { measured, orEmpty } from './fields'
import { fitsMeasure, parseNumber, rangeMessage, scaleOf } from './measures'

/** A rink of a metre's fall is none; the database and the model take the same numbers. [m] */
const depthSchema = z.number().min(-5).max(5)
const MOST_POINTS = 20

/** As it is stored: corners go round from the north one, rows of a grid follow one another along the length. */
const floorShapeSchema = z.union([
  z.object({ cornersM: z.array(depthSchema).length(4) }),
  z.object({ depthsM: z.array(z.array(depthSchema).min(2).max(MOST_POINTS)).min(2).max(MOST_POINTS).refine(isGrid) }),
])

function isGrid(rows: readonly (readonly number[])[]): boolean {
  return rows.every((row) => row.length === rows[0]?.length)
}

/** What is stored, read; something that is no floor any more counts as level. */
export function readFloor(stored: unknown): FloorShape | null {
  return floorShapeSchema.nullable().catch(null).parse(stored)
}

/** In the order in which corners are stored. */
export const CORNER_FIELDS = ['cornerNorth', 'cornerEast', 'cornerSouth', 'cornerWest'] as const

/** Of the ways to measure a floor only the one that was chosen is asked for. */
export function hiddenFloorFields(kind: unknown, gridFields: readonly string[]): readonly string[] {
  if (kind === 'corners') return gridFields
  return kind === 'grid' ? CORNER_FIELDS : [...CORNER_FIELDS, ...gridFields]
}

/** How far each corner lies below the string; an empty one lies at it. [mm] */
export function cornerFields(units: Units) {
  const drop = orEmpty(measured('drop', units))
  return { cornerNorth: drop, cornerEast: drop, cornerSouth: drop, cornerWest: drop }
}

export function cornersOf(fields: z.output<z.ZodObject<ReturnType<typeof cornerFields>>>): { cornersM: number[] } {
  return { cornersM: CORNER_FIELDS.map((name) => (fields[name] ?? 0) / 1000) }
}

/** Rows of numbers as typed, one row a line: a grid of depths [m], or what is wrong with it. */
export function parseGrid(text: string, units: Units): { depthsM: number[][] } | { fault: string } {
  const lines = text.split('\n').filter((line) => line.trim() !== '')
  const rows = lines.map((line) =>
    line
      .trim()
      .split(/[\s;]+/)
      .map((word) => parseNumber(word) ?? NaN),
  )
  if (rows.flat().some(Number.isNaN)) return { fault: 'Numbers only, a space between them, a line for each row.' }
  const width = rows[0]?.length ?? 0
  if (rows.length < 2 || width < 2) return { fault: 'At least two rows of two points.' }
  if (rows.length > MOST_POINTS || width > MOST_POINTS)
    return { fault: `At most ${MOST_POINTS} rows of ${MOST_POINTS}.` }
  if (!isGrid(rows)) return { fault: 'Every row needs the same number of points.' }
  const { toSi } = scaleOf('drop', units)
  const depthsMm = rows.map((row) => row.map(toSi))
  if (!depthsMm.flat().every((depth) => fitsMeasure('drop', depth))) return { fault: rangeMessage('drop', units) }
  return { depthsM: depthsMm.map((row) => row.map((depth) => depth / 1000)) }
}
