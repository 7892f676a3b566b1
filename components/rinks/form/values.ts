// What the rink form starts from: its text fields, for a new rink and for one that exists.
import { parseNumber, scaleOf, typed, type MeasureName } from '@/lib/schemas/measures'
import { RINK_DEFAULTS, SKIES, SKY_VIEWS, type SkyChoice } from '@/lib/schemas/rink-choices'
import type { RinkInput } from '@/lib/schemas/rinks'
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

/** The description whose share of open sky is nearest to the stored one. */
function nearestSky(skyView: number): SkyChoice {
  const distance = (sky: SkyChoice) => Math.abs(SKY_VIEWS[sky] - skyView)
  return SKIES.reduce((best, sky) => (distance(sky) < distance(best) ? sky : best))
}

/** The ice is left open: it is told when somebody has measured it. */
export function rinkValues(rink: Omit<RinkInput, 'iceThicknessMm'> & { id: string }, units: Units): FormValues {
  const { water, available } = rink
  const [hours, more] = available
  return {
    rinkId: rink.id,
    units: unitsCode(units),
    name: rink.name,
    placeName: rink.placeName ?? '',
    latitude: String(rink.latitudeDeg),
    longitude: String(rink.longitudeDeg),
    timeZone: rink.timeZone ?? '',
    length: typed('side', units, rink.lengthM),
    width: typed('side', units, rink.widthM),
    base: rink.base,
    shelter: rink.shelter,
    sky: nearestSky(rink.skyView),
    phase: rink.phase,
    fillDepth: typed('fillDepth', units, water.fillDepthMm),
    waterKind: water.kind,
    flow: typed('flow', units, water.flowLPerMin),
    waterTemperature: typed('waterTemperature', units, water.temperatureC),
    layer: typed('layer', units, water.layerMm),
    maxPasses: String(rink.maxPasses),
    hoursFrom: hours?.from ?? RINK_DEFAULTS.from,
    hoursTo: hours?.to ?? RINK_DEFAULTS.to,
    moreHoursFrom: more?.from ?? '',
    moreHoursTo: more?.to ?? '',
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
