// Words along the strip: which hours carry a tick, and which runs of snow or rain carry an amount.
import { zoneOffsetsMinutes } from '@/lib/advice/zoned-time'
import { HOUR_MILLIS } from '@/lib/physics/constants'
import type { StripHour } from './night-strip-layout'

const QUARTER = 900_000

/**
 * Instants at which the rink's clock shows every third hour. Found by walking in quarter hours, because zones may be
 * off by a half or a quarter, and nights are 23 or 25 hours long when the clocks change.
 */
export function tickInstants(startsAt: number, endsAt: number, timeZone: string): { at: number; localHour: number }[] {
  const first = Math.ceil(startsAt / QUARTER) * QUARTER
  const quarters = Array.from({ length: Math.floor((endsAt - first) / QUARTER) + 1 }, (_, n) => first + n * QUARTER)
  const offsets = zoneOffsetsMinutes(quarters, timeZone)
  return quarters.flatMap((at, index) => {
    const localHour = (((at / HOUR_MILLIS + (offsets[index] ?? 0) / 60) % 24) + 24) % 24
    return localHour % 3 === 0 ? [{ at, localHour }] : []
  })
}

/** "3 pm", "noon", "midnight"; or "15:00". */
export function tickLabel(localHour: number, clock: '12' | '24'): string {
  if (clock === '24') return `${String(localHour).padStart(2, '0')}:00`
  if (localHour === 0) return 'midnight'
  if (localHour === 12) return 'noon'
  return `${localHour % 12} ${localHour < 12 ? 'am' : 'pm'}`
}

export interface WetRun {
  startsAt: number
  endsAt: number
  snowCm: number
  rainMm: number
}

/**
 * Runs of hours with snow or rain, as far as they lie between two instants; one dry hour does not break a run. The amount
 * is that of the whole run, so that the phone's shorter strip tells the same as the wide one.
 */
export function wetRuns(
  hours: Pick<StripHour, 'startsAt' | 'snowCm' | 'rainMm'>[],
  startsAt: number,
  endsAt: number,
): WetRun[] {
  const runs: WetRun[] = []
  for (const hour of hours) {
    const isWet = hour.snowCm >= 0.05 || hour.rainMm >= 0.05
    if (!isWet) continue
    const last = runs.at(-1)
    if (last && hour.startsAt - last.endsAt <= HOUR_MILLIS) {
      last.endsAt = hour.startsAt + HOUR_MILLIS
      last.snowCm += hour.snowCm
      last.rainMm += hour.rainMm
    } else {
      runs.push({
        startsAt: hour.startsAt,
        endsAt: hour.startsAt + HOUR_MILLIS,
        snowCm: hour.snowCm,
        rainMm: hour.rainMm,
      })
    }
  }
  return runs
    .filter((run) => run.endsAt > startsAt && run.startsAt < endsAt)
    .map((run) => ({ ...run, startsAt: Math.max(run.startsAt, startsAt), endsAt: Math.min(run.endsAt, endsAt) }))
}

export interface PlacedLabel {
  x: number
  text: string
}

/**
 * Centres labels over their places, holds them inside the width and leaves out those that would run into the one before.
 *
 * @param characterWidth Mean width of a character at the strip's size of text.
 */
export function placeLabels(wanted: PlacedLabel[], width: number, characterWidth: number): PlacedLabel[] {
  const placed: PlacedLabel[] = []
  let taken = 0
  for (const { x, text } of wanted) {
    const half = (text.length * characterWidth) / 2
    const held = Math.min(Math.max(x, half), width - half)
    if (held - half < taken) continue
    placed.push({ x: Math.round(held * 10) / 10, text })
    taken = held + half + characterWidth
  }
  return placed
}
