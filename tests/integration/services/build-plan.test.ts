// The building plan: everybody of the rink reckons, its keeper keeps.
import { expect, test } from 'vitest'
import { findRinkForJudging } from '@/db/queries/rinks'
import { ForbiddenError, InvalidInputError, NotFoundError } from '@/lib/errors'
import { keepPlanSchema } from '@/lib/schemas/build-plan'
import { getPlan, keepPlan } from '@/lib/services/build-plan'
import type { Actor } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { planForm } from '@/tests/support/plan-form'

const NOW = new Date('2026-09-12T18:00:00Z')

const database = givenDatabase()
const cast = givenCast(database, NOW, { phase: 'planning', iceThickness: '' })

const keep = (actor: Actor, changes: Record<string, string> = {}) =>
  keepPlan(actor.at(NOW), keepPlanSchema.parse({ ...planForm(changes), rinkId: cast.rinkId }))
const corners = { floorKind: 'corners', cornerNorth: '0', cornerEast: '12', cornerSouth: '28', cornerWest: '15' }

test('it starts from what the rink has', async () => {
  const { start, mayManage } = await getPlan(cast.skater.at(NOW), cast.rinkId)
  // Set up with 10 cm on level ground; out from 17:00 to 01:00.
  expect(start).toMatchObject({ lengthM: 10, floor: null, leastDepthMm: 100, flowLPerMin: 25, hoursInOneGo: 8 })
  expect(start.seasonYear).toBe(2026)
  expect(mayManage).toBe(false)
  await expect(getPlan(cast.stranger.at(NOW), cast.rinkId)).rejects.toThrow(NotFoundError)
})

test('what the keeper keeps is what the rink has from then on', async () => {
  await keep(cast.keeper, { ...corners, leastDepth: '4', waterPrice: '3.5', boardHeight: '40', flow: '30' })
  const rink = await findRinkForJudging(database.db, cast.rinkId)
  expect(rink?.floor).toEqual({ cornersM: [0, 0.12, 0.28, 0.15] })
  expect(rink?.boardHeightMm).toBe(400)
  expect(rink?.water.flowLPerMin).toBe(30)
  // Mean of the corners below the string, 13.75 cm, and 4 cm over the highest.
  expect(rink?.water.fillDepthMm).toBeCloseTo(177.5, 6)
  const { start } = await getPlan(cast.keeper.at(NOW), cast.rinkId)
  expect(start).toMatchObject({ leastDepthMm: 40, waterPricePerM3: 3.5 })
})

test('crew and skaters keep nothing, a stranger finds no rink', async () => {
  await expect(keep(cast.crew)).rejects.toThrow(ForbiddenError)
  await expect(keep(cast.skater)).rejects.toThrow(ForbiddenError)
  await expect(keep(cast.stranger)).rejects.toThrow(NotFoundError)
})

test('water that is no fill is refused at its field', async () => {
  await expect(keep(cast.keeper, { leastDepth: '1' })).rejects.toThrow(InvalidInputError)
})
