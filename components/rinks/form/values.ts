// What the set-up form starts from, and the units that its quantities are typed in.
import { parseNumber, scaleOf, typed, type MeasureName } from '@/lib/schemas/measures'
import { RINK_DEFAULTS } from '@/lib/schemas/rink-choices'
import { METRIC, unitsCode, unitsOfCode, type Units } from '@/lib/units'

/** Text by field name, as FormData has it; a box that is not ticked is absent. */
export type FormValues = Record<string, string>

/** The fields that carry a unit. */
export const MEASURE_OF: Record<string, MeasureName> = {
  length: 'side',
  width: 'side',
  iceThickness: 'iceThickness',
  fillDepth: 'fillDepth',
  flow: 'flow',
  bucketSize: 'bucket',
  waterTemperature: 'waterTemperature',
  layer: 'layer',
  cornerNorth: 'drop',
  cornerEast: 'drop',
  cornerSouth: 'drop',
  cornerWest: 'drop',
  boardHeight: 'boardHeight',
  windLimit: 'windLimit',
  windChillLimit: 'windChill',
  carriesSkater: 'carriesSkater',
}

/** Ten metres are 33 feet; a form starts with round numbers in all units. */
function roundValues({ size, ice }: Units): FormValues {
  const side = size === 'ft' ? '33' : '10'
  const depths = ice === 'in' ? { fillDepth: '4', layer: '0.12' } : { fillDepth: '10', layer: '3' }
  return { length: side, width: side, ...depths }
}

/** The units that the form's quantities are typed in. */
export function unitsIn(values: FormValues): Units {
  return unitsOfCode(values.units ?? '') ?? METRIC
}

export function newRinkValues(units: Units, creationKey: string): FormValues {
  return {
    creationKey,
    units: unitsCode(units),
    ...roundValues(units),
    base: 'liner',
    shelter: 'suburban',
    sky: 'edged',
    phase: 'waiting',
    waterKind: 'cold-tap',
    maxPasses: String(RINK_DEFAULTS.maxPasses),
    hoursFrom: RINK_DEFAULTS.from,
    hoursTo: RINK_DEFAULTS.to,
    tellAt: RINK_DEFAULTS.tellAt,
    wantsPush: 'on',
    wantsEmail: 'on',
  }
}

/** Rewrites every quantity that was typed; what is no number stays for the person to mend. */
export function inUnits(values: FormValues, units: Units): FormValues {
  const from = unitsIn(values)
  const [roundBefore, round] = [roundValues(from), roundValues(units)]
  const converted = Object.entries(MEASURE_OF).flatMap(([field, measure]) => {
    const starting = round[field]
    if (starting !== undefined && values[field] === roundBefore[field]) return [[field, starting]]
    const number = parseNumber(values[field] ?? '')
    if (number === undefined || scaleOf(measure, from).unit === scaleOf(measure, units).unit) return []
    return [[field, typed(measure, units, scaleOf(measure, from).toSi(number))]]
  })
  return { ...values, ...Object.fromEntries(converted), units: unitsCode(units) }
}
