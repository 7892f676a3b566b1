// Cautions in words, by code.
import type { Caution } from '@/lib/advice/types'
import { num, text, type ClauseWriter } from './clause'
import { FLOOD_CLAUSES } from './flood-clauses'
import type { WordOptions } from './options'
import { capitalised, snowText, temperatureText, windChillText } from './quantities'
import { clockText } from './times'

const WRITERS: Record<string, ClauseWriter> = {
  frostbite: (v, w) =>
    `At ${clockText(text(v, 'at'), w)} it feels like ${windChillText(num(v, 'windChillC'), w)} by Environment Canada’s index: ` +
    `bare skin can freeze within ${num(v, 'minutes')} minutes. Cover it, or let tonight go.`,
  cold_skin: (v, w) =>
    `At ${clockText(text(v, 'at'), w)} it feels like ${windChillText(num(v, 'windChillC'), w)}: cover skin.`,
  hose_freezes_between: (v, w) =>
    `Bring the hose in and drain it between passes; left full at ${temperatureText(num(v, 'airTemperatureC'), w)} it can freeze within the hour.`,
  clear_snow_first: (v, w) =>
    `Clear ${snowText(num(v, 'snowCoverCm'), w)} of snow off the whole sheet before you flood; throw it over the boards.`,
  finish_clearing: (v, w) => `${capitalised(FLOOD_CLAUSES.finish_clearing?.(v, w) ?? '')}.`,
  rain_is_a_flood: (v, w) => `${capitalised(FLOOD_CLAUSES.rain_is_a_flood?.(v, w) ?? '')}.`,
  not_alone: () => 'Don’t flood alone, or tell someone when you will be back in.',
  wet_pavement: () => 'Keep hose water off pavements and steps.',
  backflow: () => 'Use a backflow preventer on the tap while the hose lies in water.',
  run_off: () => 'Mind where run-off goes: not toward neighbours or the street.',
  electric_leads: () => 'Keep electrical leads and plugs out of water and snow.',
  hot_water: () => 'Hot water scalds: carry no open pails on ice.',
  thickness_is_estimate: () => 'Thickness is an estimate: drill and measure before anyone skates. The keeper decides.',
  land_only: () =>
    'For ice on land only. Never judge ponds, lakes or rivers by this page: follow local authorities there.',
}

const FOR_THE_PERSON: ReadonlySet<string> = new Set([
  'frostbite',
  'cold_skin',
  'not_alone',
  'hose_freezes_between',
  'hot_water',
  'electric_leads',
  'wet_pavement',
])

/** Whether a caution is about the person and the hose; the others are about the ice and the water. */
export function isForPerson({ code }: Pick<Caution, 'code'>): boolean {
  return FOR_THE_PERSON.has(code)
}

export const CAUTION_CODES: readonly string[] = Object.keys(WRITERS)

/** One caution as a sentence or two. */
export function cautionText(caution: Caution, words: WordOptions): string {
  return WRITERS[caution.code]?.(caution.values, words) ?? ''
}
