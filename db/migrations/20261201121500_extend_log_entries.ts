// Where a flood's water came from, and what the model said when somebody measured.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table log_entries
      add column water_kind text check (water_kind in ('cold-tap', 'hot-tap', 'hydrant', 'tanker')),
      -- Of a reading: the thickness the model had for that hour, so that the two can be held side by side for good.
      add column model_thickness_mm double precision check (model_thickness_mm between 0 and 2000),
      add check (kind = 'reading' or model_thickness_mm is null)
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('alter table log_entries drop column water_kind, drop column model_thickness_mm')
}
