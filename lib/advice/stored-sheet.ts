// A sheet's state read back from storage: checked, because it went out as JSON.
import type { SheetState } from '@/lib/physics/sheet'

const isNumber = (value: unknown): value is number => typeof value === 'number' && Number.isFinite(value)
const isNumberList = (value: unknown): value is number[] => Array.isArray(value) && value.every(isNumber)

const NUMBERS = ['snowKgM2', 'snowDepthCm', 'belowKgM2', 'belowTemperatureC', 'surfaceTemperatureC']

/**
 * Reads a state that `judge` gave out.
 *
 * @param stored What was kept.
 * @returns The same state, fit for physics; units of SheetState.
 * @throws RangeError when it is not one.
 *
 * Source: ours.
 */
export function readStoredSheet(stored: unknown): SheetState {
  const state = stored as Record<string, unknown> | null
  const isSheet =
    typeof state === 'object' &&
    state !== null &&
    ['liner', 'ground', 'snow'].includes(String(state.base)) &&
    isNumberList(state.massKgM2) &&
    isNumberList(state.enthalpyJM2) &&
    state.massKgM2.length === state.enthalpyJM2.length &&
    NUMBERS.every((name) => isNumber(state[name]))
  if (!isSheet) throw new RangeError('sheet.state is not a stored sheet')
  return stored as SheetState
}
