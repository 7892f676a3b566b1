// What the form of the plan starts from: what the rink has, in the person's units, or what stands in the address.
import { GRID, pointField } from '@/lib/schemas/build-plan'
import { CORNER_FIELDS } from '@/lib/schemas/floor'
import { typed } from '@/lib/schemas/measures'
import type { PlanView } from '@/lib/services/build-plan'
import type { Units } from '@/lib/units'

/** Text by field name. */
export type PlanValues = Record<string, string>

export function startValues(start: PlanView['start'], units: Units): PlanValues {
  return {
    length: typed('side', units, start.lengthM),
    width: typed('side', units, start.widthM),
    leastDepth: typed('leastDepth', units, start.leastDepthMm),
    flow: typed('flow', units, start.flowLPerMin),
    bucketSize: '',
    bucketSeconds: '',
    hoursInOneGo: String(Number(start.hoursInOneGo.toFixed(2))),
    waterPrice: start.waterPricePerM3 === null ? '' : typed('waterPrice', units, start.waterPricePerM3),
    boardHeight: start.boardHeightMm === null ? '' : typed('boardHeight', units, start.boardHeightMm),
    freeboard: typed('freeboard', units, 50),
    season: String(start.seasonYear),
    ...floorValues(start.floor, units),
  }
}

function floorValues(floor: PlanView['start']['floor'], units: Units): PlanValues {
  const depth = (metres: number) => typed('drop', units, metres * 1000)
  const level = {
    floorKind: 'level',
    ...Object.fromEntries(CORNER_FIELDS.map((name) => [name, ''])),
    rows: String(GRID.usualRows),
    columns: String(GRID.usualColumns),
  }
  if (floor === null) return level
  if ('cornersM' in floor) {
    const corners = CORNER_FIELDS.map((name, corner) => [name, depth(floor.cornersM[corner] ?? 0)])
    return { ...level, floorKind: 'corners', ...Object.fromEntries(corners) }
  }
  const points = floor.depthsM.flatMap((row, rowIndex) =>
    row.map((metres, columnIndex) => [pointField(rowIndex + 1, columnIndex + 1), depth(metres)]),
  )
  return {
    ...level,
    floorKind: 'grid',
    rows: String(floor.depthsM.length),
    columns: String(floor.depthsM[0]?.length ?? GRID.usualColumns),
    ...Object.fromEntries(points),
  }
}

/** A name given twice in the address is its first. Next's own fields are left out. */
export function typedValues(query: Record<string, string | string[] | undefined>): PlanValues {
  const pairs = Object.entries(query).flatMap(([name, value]) => {
    const text = Array.isArray(value) ? value[0] : value
    return text === undefined || name.startsWith('$') || text.length > 200 ? [] : [[name, text]]
  })
  return Object.fromEntries(pairs)
}
