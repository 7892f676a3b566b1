// Quantities of the building plan in words.
import { GRAVITY } from '@/lib/physics/constants'
import { litresToGallons, metresToFeet } from '@/lib/units'
import type { WordOptions } from './options'
import { iceText, numberText } from './quantities'

/** A pound-force by definition: 0.45359237 kg × 9.80665 m/s². A moment on a length is the same figure per foot and per metre. */
const N_PER_LB = 4.4482216
const M_PER_FOOT = 0.3048

/** Water in bulk. */
export function volumeText(m3: number, words: WordOptions): string {
  return words.units.water === 'gal'
    ? `${numberText(litresToGallons(m3 * 1000), 0, words)} gal`
    : `${numberText(m3, 1, words)} m³`
}

/** Depths and heights within the boards. */
export function depthText(metres: number, words: WordOptions): string {
  return iceText(metres * 1000, words)
}

/** Lengths to the hand's breadth, without a needless decimal. */
export function lengthText(metres: number, words: WordOptions): string {
  const value = words.units.size === 'ft' ? metresToFeet(metres) : metres
  const tenths = Math.round(value * 10)
  return `${numberText(value, tenths % 10 === 0 ? 0 : 1, words)} ${words.units.size}`
}

/** Push of water on the boards, as a weight. */
export function pushText(newtonPerM: number, words: WordOptions): string {
  return words.units.size === 'ft'
    ? `${numberText((newtonPerM * M_PER_FOOT) / N_PER_LB, 0, words)} lb on each foot`
    : `${numberText(newtonPerM / GRAVITY, 0, words)} kg on each metre`
}

/** Turning moment at the foot of the boards. */
export function momentText(newtonMPerM: number, words: WordOptions): string {
  return words.units.size === 'ft'
    ? `${momentFigure(newtonMPerM / N_PER_LB, words)} lb ft on each foot`
    : `${momentFigure(newtonMPerM, words)} N m on each metre`
}

/** Low boards have a moment below one: no zero that is none. */
const momentFigure = (value: number, words: WordOptions) => numberText(value, value < 10 ? 1 : 0, words)

export function shareText(share: number, words: WordOptions): string {
  return `${numberText(share * 100, 0, words)} %`
}

/** Hose time to ten minutes: nobody's hose is steadier. */
export function roundedHours(hours: number): number {
  return hours < 1 ? Math.round(hours * 60) : Math.round(hours * 6) * 10
}
