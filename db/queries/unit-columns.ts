// A person's five units, kept in five columns and read as one value.
import type { Db } from '@/db/knex'
import type { UserRow } from '@/db/types'
import { UNIT_NAMES, type Units } from '@/lib/units'

/** For `select`: an object of the five units of the row with this alias. */
export function unitsColumn(db: Db, alias: string) {
  const parts = UNIT_NAMES.map((name) => `'${name}', ${alias}.unit_${name}`)
  return db.raw<Units>(`json_build_object(${parts.join(', ')})`)
}

export function unitColumns({ temperature, ice, water, size, wind }: Units): Partial<UserRow> {
  return { unit_temperature: temperature, unit_ice: ice, unit_water: water, unit_size: size, unit_wind: wind }
}
