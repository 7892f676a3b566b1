// Setting up a rink: all or nothing, and once.
import { findAccount } from '@/db/queries/users'
import { IMPERIAL } from '@/lib/units'
import { describe, expect, test } from 'vitest'
import { findRinkForJudging } from '@/db/queries/rinks'
import { setUpRinkSchema } from '@/lib/schemas/rinks'
import { listMyRinks, setUpRink } from '@/lib/services/rinks'
import { addActor, rinkForm, type Actor } from '@/tests/support/cast'
import { givenCast, givenDatabase } from '@/tests/support/given-cast'

const NOW = new Date('2027-01-12T19:10:00Z')

const database = givenDatabase()
const cast = givenCast(database, NOW)

const setUp = (actor: Actor, form = rinkForm()) => setUpRink(actor.at(NOW), setUpRinkSchema.parse(form))
const count = async (table: string) => Number((await database.db(table).count({ rows: '*' }).first())?.rows)
const jobs = async (task: string) =>
  (
    await database.db.raw(
      'select key, payload from graphile_worker._private_jobs j join graphile_worker._private_tasks t on t.id = j.task_id where t.identifier = ?',
      [task],
    )
  ).rows as { key: string; payload: Record<string, string> }[]

describe('setting up', () => {
  test('a keeper gets a rink with its water, hours, preferences, sheet and first pull', async () => {
    const anna = await addActor(database.db, 'Anna')
    const { rinkId } = await setUp(
      anna,
      rinkForm({ latitude: '45.8962', longitude: '-77.2837', moreHoursFrom: '05:00', moreHoursTo: '07:00' }),
    )
    const rink = await findRinkForJudging(database.db, rinkId)
    // The grid is 0.01 degrees wide: lib/weather/cell.ts.
    expect(rink?.cell).toEqual({ latitudeDeg: 45.9, longitudeDeg: -77.28 })
    expect(rink).toMatchObject({
      name: 'Birch Lane',
      latitudeDeg: 45.8962,
      longitudeDeg: -77.2837,
      settingsVersion: 1,
      water: { kind: 'cold-tap', flowLPerMin: 25, temperatureC: 6, layerMm: 3, fillDepthMm: 100 },
      available: [
        { from: '05:00', to: '07:00' },
        { from: '17:00', to: '01:00' },
      ],
    })
    expect(await listMyRinks(anna.at(NOW))).toMatchObject([{ id: rinkId, role: 'keeper' }])
    expect(await database.db('alert_preferences').where({ rink_id: rinkId })).toMatchObject([
      { user_id: anna.userId, tell_at: '15:30', wants_email: true, wants_push: true, muted_through: null },
    ])
    expect(await database.db('sheet_states').where({ rink_id: rinkId })).toMatchObject([
      { origin: 'reported', as_of: NOW, thickness_mm: 90 },
    ])
    expect(await jobs('pull-forecast')).toContainEqual(
      expect.objectContaining({ key: `pull:${rink?.gridCellId}`, payload: { cellId: rink?.gridCellId } }),
    )
  })

  test('zone and place follow from the position when they were left empty', async () => {
    const { rinkId } = await setUp(
      cast.stranger,
      rinkForm({ placeName: '', timeZone: '', latitude: '45.9', longitude: '-77.3' }),
    )
    // Petawawa lies at 45.89 N 77.28 W, in Ontario's eastern zone.
    expect(await findRinkForJudging(database.db, rinkId)).toMatchObject({
      timeZone: 'America/Toronto',
      placeName: 'Near Petawawa',
    })
  })

  test('what was typed in feet and gallons is stored in metres and litres, and read in the units it was typed in', async () => {
    const anna = await addActor(database.db, 'Anna')
    const imperial = {
      units: 'imperial',
      length: '40',
      width: '20',
      iceThickness: '4',
      flow: '5',
      waterTemperature: '41',
      layer: '0.125',
      fillDepth: '4',
    }
    const { rinkId } = await setUp(anna, rinkForm(imperial))
    const rink = await findRinkForJudging(database.db, rinkId)
    // 40 ft = 12.192 m; 5 US gal = 18.927 L; 41 °F = 5 °C; 1/8 in = 3.175 mm; 4 in = 101.6 mm.
    expect(rink?.lengthM).toBeCloseTo(12.192, 9)
    expect(rink?.water.flowLPerMin).toBeCloseTo(18.92705892, 8)
    expect(rink?.water.temperatureC).toBeCloseTo(5, 9)
    expect(rink?.water.layerMm).toBeCloseTo(3.175, 9)
    expect(rink?.water.fillDepthMm).toBeCloseTo(101.6, 9)
    expect((await findAccount(database.db, anna.userId))?.units).toEqual(IMPERIAL)
  })

  test('a form sent twice, and two at once, make one rink', async () => {
    const form = rinkForm()
    const before = await count('rinks')
    const [first, second] = await Promise.all([setUp(cast.keeper, form), setUp(cast.keeper, form)])
    expect(second).toEqual(first)
    expect(await setUp(cast.keeper, form)).toEqual(first)
    expect(await count('rinks')).toBe(before + 1)
  })

  test('the same key from somebody else is their own rink', async () => {
    const form = rinkForm()
    const mine = await setUp(cast.keeper, form)
    expect(await setUp(cast.stranger, form)).not.toEqual(mine)
  })

  test('neighbours share one cell, also when they set up at the same moment', async () => {
    const here = { latitude: '46.111', longitude: '-77.111' }
    const made = await Promise.all([
      setUp(cast.keeper, rinkForm(here)),
      setUp(cast.stranger, rinkForm({ ...here, latitude: '46.112' })),
    ])
    const cells = await database
      .db('rinks')
      .whereIn(
        'id',
        made.map(({ rinkId }) => rinkId),
      )
      .distinct('grid_cell_id')
    expect(cells).toHaveLength(1)
  })

  test('when one part cannot be stored, nothing is', async () => {
    const before = await count('rinks')
    const input = setUpRinkSchema.parse(rinkForm())
    const broken = { ...input, rink: { ...input.rink, water: { ...input.rink.water, flowLPerMin: 500 } } }
    await expect(setUpRink(cast.keeper.at(NOW), broken)).rejects.toThrow(/flow_l_per_min/)
    expect(await count('rinks')).toBe(before)
  })
})
