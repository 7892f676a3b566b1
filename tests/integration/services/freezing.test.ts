// A freezing rink: reckoned from open water, corrected by a drilled hole, opened by its keeper alone.
import { beforeEach, expect, test } from 'vitest'
import { insertForecast } from '@/db/queries/forecasts'
import { ConflictError, ForbiddenError, NotFoundError } from '@/lib/errors'
import { HOUR_MILLIS, MINUTE_MILLIS } from '@/lib/physics/constants'
import { checkFillSchema, startFillSchema } from '@/lib/schemas/fills'
import { getFreezing, openForSkating } from '@/lib/services/freezing'
import { checkFill, finishFill, giveUpFill, startFill } from '@/lib/services/fills'
import { changeIce } from '@/lib/services/rink-settings'
import { requireRink } from '@/lib/access/require-rink'
import { refreshOutlook } from '@/lib/services/outlooks'
import { writeEntry } from '@/lib/services/log'
import { steadyHours } from '@/tests/support/advice-weather'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { typedEntry } from '@/tests/support/log-form'

// The steady hours begin on Tuesday, 12 January 2027, at 17:00 UTC.
const FILLED = new Date('2027-01-12T18:00:00Z')
const later = (hours: number) => new Date(FILLED.getTime() + hours * HOUR_MILLIS)

const database = givenDatabase()
const cast = givenCast(database, later(-30), { phase: 'waiting', iceThickness: '' })

beforeEach(async () => {
  await insertForecast(database.db, {
    cellId: cast.cellId,
    slotAt: later(-1),
    provider: 'test',
    issuedAt: null,
    fetchedAt: later(-1),
    expiresAt: later(5),
    hours: steadyHours(10 * 24, { airTemperatureC: -10 }),
    members: null,
    attribution: { text: 'Test', url: 'https://weather.example', licence: 'none' },
  })
  await startFill(cast.keeper.at(later(-7)), startFillSchema.parse({ rinkId: cast.rinkId, units: 'metric' }))
  await finishFill(cast.keeper.at(FILLED), { rinkId: cast.rinkId })
})

const drill = (thickness: string, at: Date) =>
  writeEntry(cast.crew.at(at), typedEntry(cast.rinkId, { kind: 'reading', thickness }))
const freezing = (at: Date, actor = cast.keeper) => getFreezing(actor.at(at), cast.rinkId)
const open = (at: Date, actor = cast.keeper) => openForSkating(actor.at(at), { rinkId: cast.rinkId })

test('ice grows from open water, everybody of the rink sees it, a stranger nothing', async () => {
  const view = await freezing(later(24), cast.skater)
  const { outlook } = view
  expect(view).toMatchObject({ mayWrite: false, mayManage: false, sinceAt: FILLED.toISOString() })
  // Stefan's law at -10 °C bounds it from above: √(2 · 2.2 · 10 · 86,400 / (917 · 333,500)) m = 11.1 cm without any resistance.
  expect(outlook?.now.thicknessMm).toBeGreaterThan(20)
  expect(outlook?.now.thicknessMm).toBeLessThan(111)
  expect(outlook?.carriesSkaterAt.p50).not.toBeNull()
  await expect(freezing(later(24), cast.stranger)).rejects.toThrow(NotFoundError)
})

/** A fill that somebody wrote down too late: a minute of hose, 25 L on 100 m². */
async function fillInAMinute(depthMm: string, at: Date) {
  const aMinute = new Date(at.getTime() + MINUTE_MILLIS)
  await changeIce(cast.keeper.at(at), { rinkId: cast.rinkId, phase: 'waiting', iceThicknessMm: undefined })
  await startFill(cast.keeper.at(at), startFillSchema.parse({ rinkId: cast.rinkId, units: 'metric' }))
  const look = { rinkId: cast.rinkId, units: 'metric', lowCornerDepth: depthMm, note: '' }
  await checkFill(cast.keeper.at(at), checkFillSchema.parse(look))
  await finishFill(cast.keeper.at(aMinute), { rinkId: cast.rinkId })
}

test('what was measured at the low corner counts over a hose that was written down late', async () => {
  await fillInAMinute('9', later(1))
  const { now } = (await freezing(later(2))).outlook ?? {}
  // 9 cm of water on level ground, of which the ice has taken its 917 of 1000.
  expect((now?.waterBelowMm ?? 0) + (now?.thicknessMm ?? 0) * 0.917).toBeCloseTo(90, 0)
})

test('ice that is thicker than the water that was counted does not stand on the floor for that', async () => {
  await fillInAMinute('', later(1))
  await drill('7', later(30))
  const { outlook } = await freezing(later(30))
  expect(outlook?.now.thicknessMm).toBeCloseTo(70, 0)
  // The fill that was wanted is 10 cm deep: 100 - 0.917 × 70.
  expect(outlook?.now.waterBelowMm).toBeCloseTo(36, 0)
})

test('a hole a millimetre under the limit opens no rink', async () => {
  await drill('9.9', later(30))
  expect((await freezing(later(30))).isDrilledThick).toBe(false)
  await expect(open(later(30))).rejects.toThrow(ConflictError)
})

test('a fill that was given up leaves the one before it on the rink', async () => {
  await changeIce(cast.keeper.at(later(1)), { rinkId: cast.rinkId, phase: 'waiting', iceThicknessMm: undefined })
  await startFill(cast.keeper.at(later(1)), startFillSchema.parse({ rinkId: cast.rinkId, units: 'metric' }))
  await giveUpFill(cast.keeper.at(later(1.1)), { rinkId: cast.rinkId })
  await changeIce(cast.keeper.at(later(2)), { rinkId: cast.rinkId, phase: 'freezing', iceThicknessMm: 20 })
  const { now } = (await freezing(later(2))).outlook ?? {}
  // Seven hours at 25 L/min on 100 m² are 105 mm.
  expect((now?.waterBelowMm ?? 0) + (now?.thicknessMm ?? 0) * 0.917).toBeCloseTo(105, 0)
})

test('a drilled hole corrects the estimate', async () => {
  const before = (await freezing(later(24))).outlook?.now.thicknessMm ?? 0
  await drill('2', later(24))
  const view = await freezing(later(24))
  expect(before).toBeGreaterThan(25)
  expect(view.outlook?.now.thicknessMm).toBeCloseTo(20, 0)
  expect(view.sheetMm).toBe(20)
  expect(view.reading).toMatchObject({ thicknessMm: 20, by: 'Crew' })
  expect(view.isDrilledThick).toBe(false)
})

test('the keeper opens it once the hole is thick enough; crew does not, and a second time it is open already', async () => {
  await drill('6', later(48))
  await expect(open(later(48))).rejects.toThrow(ConflictError)
  await drill('10', later(72))
  expect((await freezing(later(72))).isDrilledThick).toBe(true)
  await expect(open(later(72), cast.crew)).rejects.toThrow(ForbiddenError)
  await expect(open(later(72), cast.stranger)).rejects.toThrow(NotFoundError)
  const results = await Promise.allSettled([open(later(72)), open(later(72))])
  expect(results.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
  expect((await freezing(later(73))).rink.phase).toBe('skating')
})

test('a hole drilled before the fill, or long ago, opens nothing', async () => {
  await drill('10', later(24))
  await expect(open(later(24 + 73))).rejects.toThrow(ConflictError)
})

// The forecast was read an hour before the fill, holds for six hours and has ten days from 17:00 UTC: 239 h after the fill.
test('a forecast past its time is called stale, and past its last hour nothing is reckoned from it', async () => {
  expect((await freezing(later(4))).forecast).toMatchObject({ isStale: false, fetchedAt: later(-1).toISOString() })
  const old = await freezing(later(6))
  expect(old.forecast?.isStale).toBe(true)
  expect(old.outlook).not.toBeNull()
  expect((await freezing(later(238.9))).outlook).not.toBeNull()
  const runOut = await freezing(later(239))
  expect(runOut.outlook).toBeNull()
  expect(runOut.forecast).toMatchObject({ isStale: true, fetchedAt: later(-1).toISOString() })
})

test('nothing is judged from a forecast that has run out', async () => {
  const judged = async (hours: number) => {
    const { db, now, ...keeper } = cast.keeper.at(later(hours))
    return refreshOutlook({ db, now }, await requireRink({ db, now, ...keeper }, cast.rinkId, 'view'))
  }
  expect(await judged(238)).toBe(true)
  expect(await judged(240)).toBe(false)
  // A rink taken up again in autumn, whose weather was last read in March.
  expect(await judged(200 * 24)).toBe(false)
})
