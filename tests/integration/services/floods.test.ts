// Checking off a pass: once, by those who may, for tonight; and what that does to the sheet and the plan.
import { beforeEach, describe, expect, test } from 'vitest'
import { ForbiddenError, InvalidInputError, NotFoundError } from '@/lib/errors'
import { DAY_MILLIS } from '@/lib/physics/constants'
import { checkOffPass, undoPass } from '@/lib/services/floods'
import { writeEntry } from '@/lib/services/log'
import { getTonight } from '@/lib/services/tonight'
import type { Actor } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'
import { typedEntry } from '@/tests/support/log-form'
import { judgeForecast, judgeNow } from '@/tests/support/night-at-the-rink'

const NOW = new Date('2027-01-12T23:10:00Z')
const NIGHT = '2027-01-12'

const database = givenDatabase()
const cast = givenCast(database, new Date('2027-01-12T19:10:00Z'))

beforeEach(async () => {
  await judgeForecast(database.db, cast, NOW)
})

const pass = (changes = {}) => ({ rinkId: cast.rinkId, nightDate: NIGHT, passNumber: 1, layerMm: 3, ...changes })
const floods = () => database.db('log_entries').where({ rink_id: cast.rinkId, kind: 'flood', deleted_at: null })
const tonight = (actor: Actor) => getTonight(actor.at(NOW), cast.rinkId)

test('a pass is logged with its water, and shown as poured with who did it', async () => {
  await checkOffPass(cast.crew.at(NOW), pass())
  const [flood] = await floods()
  expect(flood).toMatchObject({ layer_mm: 3, water_l: 300, written_by: cast.crew.userId })
  const view = await tonight(cast.keeper)
  expect(view.outlook?.passes[0]).toMatchObject({ number: 1, poured: { by: 'Crew' } })
})

test('checking off twice, or from two phones at once, logs it once', async () => {
  await Promise.all([checkOffPass(cast.crew.at(NOW), pass()), checkOffPass(cast.keeper.at(NOW), pass())])
  await checkOffPass(cast.crew.at(NOW), pass())
  expect(await floods()).toHaveLength(1)
})

test('a flood written down for an hour earlier takes a number that no pass has', async () => {
  await checkOffPass(cast.crew.at(NOW), pass())
  await writeEntry(cast.keeper.at(NOW), typedEntry(cast.rinkId, { minutesAgo: '60' }))
  await writeEntry(cast.keeper.at(NOW), typedEntry(cast.rinkId, { minutesAgo: '30' }))
  const poured = (await tonight(cast.keeper)).outlook?.passes.filter((one) => one.poured !== null) ?? []
  expect(poured.map(({ number, poured: by }) => [number, by?.by])).toEqual([
    [2, 'Keeper'],
    [3, 'Keeper'],
    [1, 'Crew'],
  ])
})

test('the night is judged anew with the poured layer in the sheet', async () => {
  const before = await tonight(cast.keeper)
  await checkOffPass(cast.keeper.at(NOW), pass())
  expect(await judgeNow(database.db, cast, NOW)).toBe(true)
  const after = await tonight(cast.keeper)
  const lastSheetMm = (view: typeof after) => view.outlook?.hours.at(-1)?.sheet.thicknessMm ?? 0
  // 3 mm of water are 3.3 mm of ice: 1000/917.
  expect(lastSheetMm(after) - lastSheetMm(before)).toBeGreaterThan(2.5)
  expect(lastSheetMm(after) - lastSheetMm(before)).toBeLessThan(4)
})

test('a slip is taken back', async () => {
  await checkOffPass(cast.keeper.at(NOW), pass())
  await undoPass(cast.keeper.at(NOW), pass())
  await undoPass(cast.keeper.at(NOW), pass())
  expect(await floods()).toHaveLength(0)
})

describe('refusals', () => {
  test('a skater may look, and log nothing', async () => {
    await expect(checkOffPass(cast.skater.at(NOW), pass())).rejects.toThrow(ForbiddenError)
    await expect(undoPass(cast.skater.at(NOW), pass())).rejects.toThrow(ForbiddenError)
    expect((await tonight(cast.skater)).viewer.role).toBe('skater')
  })

  test('a stranger cannot see that the rink exists', async () => {
    await expect(checkOffPass(cast.stranger.at(NOW), pass())).rejects.toThrow(NotFoundError)
    await expect(tonight(cast.stranger)).rejects.toThrow(NotFoundError)
  })

  test('a night that is not tonight', async () => {
    await expect(checkOffPass(cast.keeper.at(NOW), pass({ nightDate: '2027-01-10' }))).rejects.toThrow(
      InvalidInputError,
    )
    expect(await floods()).toHaveLength(0)
  })

  test('taking back what was poured on a night that is over', async () => {
    await checkOffPass(cast.keeper.at(NOW), pass())
    const tomorrow = new Date(NOW.getTime() + DAY_MILLIS)
    await expect(undoPass(cast.keeper.at(tomorrow), pass())).rejects.toThrow(InvalidInputError)
    expect(await floods()).toHaveLength(1)
  })
})
