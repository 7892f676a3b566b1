// The keeper's own plan of a night, where it differs from the advised one.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table own_passes (
      rink_id uuid not null references rinks on delete cascade,
      night_date date not null,
      pass_number smallint not null check (pass_number between 1 and 20),
      starts_at timestamptz not null,
      layer_mm double precision not null check (layer_mm between 0.1 and 100),
      water_temperature_c double precision not null check (water_temperature_c between 0 and 95),
      flow_l_per_min double precision not null check (flow_l_per_min > 0),
      changed_by uuid references users on delete set null,
      changed_at timestamptz not null,
      primary key (rink_id, night_date, pass_number)
    )
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table own_passes')
}
