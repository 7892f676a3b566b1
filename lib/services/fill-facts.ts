// A fill as the advice takes it: sessions and readings with instants as text, the corner that is read, the water poured.
import type { Fill, FillCheck, FillSession } from '@/db/queries/fills'
import type { RinkForJudging } from '@/db/queries/rinks'
import { litresPouredBy, type FillProgressInput, type HoseSession } from '@/lib/advice/fill-progress'
import { levelOfReading, type LevelReading } from '@/lib/advice/leak-warning'
import { cornerDepthsM, floorOf } from '@/lib/physics/floor'
import { levelOf, stageAt } from '@/lib/physics/stage'

export type RinkSize = Pick<RinkForJudging, 'lengthM' | 'widthM' | 'floor'>

/** 1 mm on 1 m² is 1 L. */
export function targetLitres({ lengthM, widthM }: RinkSize, { targetDepthMm }: Pick<Fill, 'targetDepthMm'>): number {
  return targetDepthMm * lengthM * widthM
}

function hoseSessions(sessions: readonly FillSession[]): HoseSession[] {
  return sessions.map(({ startedAt, stoppedAt, flowLPerMin }) => ({
    startedAt: startedAt.toISOString(),
    stoppedAt: stoppedAt?.toISOString() ?? null,
    flowLPerMin,
  }))
}

/** Water that the hose has brought by an instant. [L] */
export function litresBy(sessions: readonly FillSession[], at: Date): number {
  return litresPouredBy(hoseSessions(sessions), at.getTime())
}

/**
 * Mean depth of the water that a finished fill left. What was measured over the lowest corner counts where it is more than
 * the hose is known to have brought: whoever writes the hose down late has water that the log does not know. [mm]
 */
export function filledDepthMm(
  rink: RinkSize,
  { finishedAt }: Pick<Fill, 'finishedAt'>,
  { sessions, checks }: { sessions: readonly FillSession[]; checks: readonly FillCheck[] },
): number {
  const areaM2 = rink.lengthM * rink.widthM
  const pouredMm = litresBy(sessions, finishedAt ?? new Date(0)) / areaM2
  const reading = levelReadings(rink, checks).at(-1)
  if (!reading) return pouredMm
  const floor = floorOf(rink.lengthM, rink.widthM, rink.floor)
  return Math.max(pouredMm, (stageAt(floor, levelOfReading(floor, reading)).volumeM3 / areaM2) * 1000)
}

/** The corner over which water is measured: the lowest, the first of equals. */
export function lowCornerOf({ lengthM, widthM, floor }: RinkSize): 0 | 1 | 2 | 3 {
  const depths = cornerDepthsM(floorOf(lengthM, widthM, floor))
  return depths.indexOf(Math.max(...depths)) as 0 | 1 | 2 | 3
}

/** Water over the lowest corner once so many litres stand on the floor. [mm] */
export function lowCornerDepthMm({ lengthM, widthM, floor }: RinkSize, litres: number): number {
  const ground = floorOf(lengthM, widthM, floor)
  return Math.max(0, Math.max(...cornerDepthsM(ground)) - levelOf(ground, litres / 1000)) * 1000
}

/** Looks with a depth are readings of the level; the others only show that somebody was there. */
function levelReadings(rink: RinkSize, checks: readonly FillCheck[]): LevelReading[] {
  const corner = lowCornerOf(rink)
  return checks.flatMap(({ checkedAt, lowCornerDepthMm: depthMm }) =>
    depthMm === null ? [] : [{ at: checkedAt.toISOString(), corner, depthMm }],
  )
}

export function progressInput(
  rink: RinkSize,
  fill: Fill,
  { sessions, checks, now }: { sessions: readonly FillSession[]; checks: readonly FillCheck[]; now: Date },
): FillProgressInput {
  return {
    now: now.toISOString(),
    lengthM: rink.lengthM,
    widthM: rink.widthM,
    floor: rink.floor,
    targetL: targetLitres(rink, fill),
    sessions: hoseSessions(sessions),
    readings: levelReadings(rink, checks),
    checkedAt: checks.map(({ checkedAt }) => checkedAt.toISOString()),
  }
}
