// What each settings form starts from: what is stored, in the person's units.
import { hoursField } from '@/lib/schemas/hours'
import { typed } from '@/lib/schemas/measures'
import { SKIES, SKY_VIEWS } from '@/lib/schemas/rink-choices'
import type { RinkSettings } from '@/lib/services/rink-settings'
import { unitsCode, type Units } from '@/lib/units'
import type { FormValues } from './values'

const of = (rink: RinkSettings, units: Units): FormValues => ({ rinkId: rink.id, units: unitsCode(units) })

export function placeValues(rink: RinkSettings): FormValues {
  return {
    rinkId: rink.id,
    name: rink.name,
    placeName: rink.placeName,
    latitude: String(rink.latitudeDeg),
    longitude: String(rink.longitudeDeg),
    timeZone: rink.timeZone,
    zoneBy: rink.timeZoneBy,
  }
}

/** The share of sky as a whole per cent. */
export const skyPercent = (skyView: number) => `${Math.round(100 * skyView)} %`

export function yardValues(rink: RinkSettings, units: Units): FormValues {
  return {
    ...of(rink, units),
    length: typed('side', units, rink.lengthM),
    width: typed('side', units, rink.widthM),
    base: rink.base,
    shelter: rink.shelter,
    sky: SKIES.find((sky) => SKY_VIEWS[sky] === rink.skyView) ?? 'kept',
    boardHeight: rink.boardHeightMm === null ? '' : typed('boardHeight', units, rink.boardHeightMm),
    ...floorValues(rink, units),
  }
}

function floorValues({ floor }: RinkSettings, units: Units): FormValues {
  const depth = (metres: number | undefined) => typed('drop', units, 1000 * (metres ?? 0))
  if (floor === null) return { floorKind: 'level' }
  if ('depthsM' in floor) {
    return { floorKind: 'grid', grid: floor.depthsM.map((row) => row.map(depth).join(' ')).join('\n') }
  }
  const [north, east, south, west] = floor.cornersM
  return {
    floorKind: 'corners',
    cornerNorth: depth(north),
    cornerEast: depth(east),
    cornerSouth: depth(south),
    cornerWest: depth(west),
  }
}

/** The thickness is left open: it is told when somebody has measured it. */
export function iceValues(rink: RinkSettings, units: Units): FormValues {
  return { ...of(rink, units), phase: rink.phase, base: rink.base }
}

/** @param sourceId Undefined for a source to be added: it starts with what the usual one pours. */
export function waterValues(rink: RinkSettings, units: Units, sourceId: string | undefined): FormValues {
  const source = rink.sources.find(({ id }) => id === sourceId)
  const poured = source ?? rink.water
  return {
    ...of(rink, units),
    sourceId: source?.id ?? '',
    base: rink.base,
    waterKind: source?.kind ?? 'hot-tap',
    flow: source ? typed('flow', units, source.flowLPerMin) : '',
    waterTemperature: source ? typed('waterTemperature', units, source.temperatureC) : '',
    layer: typed('layer', units, poured.layerMm),
    fillDepth: typed('fillDepth', units, poured.fillDepthMm),
  }
}

export function hoursValues(rink: RinkSettings): FormValues {
  const values: FormValues = { rinkId: rink.id, maxPasses: String(rink.maxPasses) }
  rink.available.forEach(({ from, to, weekdays }, index) => {
    const row = index + 1
    values[hoursField.from(row)] = from
    values[hoursField.to(row)] = to
    for (const day of weekdays) values[hoursField.day(row, day)] = 'on'
  })
  return values
}

export function limitsValues(rink: RinkSettings, units: Units): FormValues {
  return {
    ...of(rink, units),
    windLimit: rink.windLimitMps === null ? '' : typed('windLimit', units, rink.windLimitMps),
    windChillLimit: rink.windChillLimitC === null ? '' : typed('windChill', units, rink.windChillLimitC),
    carriesSkater: typed('carriesSkater', units, rink.carriesSkaterMm),
  }
}
