// Who chose a rink's clock: near the border of a zone a keeper may go by the neighbours' clock, wherever the rink is moved.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table rinks add column time_zone_by text not null default 'place' check (time_zone_by in ('place', 'keeper'))
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('alter table rinks drop column time_zone_by')
}
