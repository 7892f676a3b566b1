// The floor under a rink, its boards, its keeper's limits, several taps, and hours by weekday.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table rinks
      -- How far the ground lies below the highest point: corners or a grid (lib/schemas/floor.ts); null is level ground.
      add column floor jsonb check (floor is null or jsonb_typeof(floor) = 'object'),
      add column board_height_mm double precision check (board_height_mm between 50 and 1500),
      add column carries_skater_mm double precision not null default 100 check (carries_skater_mm between 70 and 300),
      -- Above this wind at the rink, or below this wind chill, the keeper stays in; null leaves it to the defaults.
      add column wind_limit_mps double precision check (wind_limit_mps between 1 and 30),
      add column wind_chill_limit_c double precision check (wind_chill_limit_c between -60 and 0),
      add column water_price_per_m3 double precision check (water_price_per_m3 between 0 and 1000);

    alter table available_hours
      add column id uuid not null default gen_random_uuid(),
      -- ISO weekdays, Monday is 1, on which the hours start.
      add column weekdays smallint[] not null default '{1,2,3,4,5,6,7}'
        check (cardinality(weekdays) between 1 and 7 and weekdays <@ '{1,2,3,4,5,6,7}'),
      drop constraint available_hours_pkey,
      add primary key (id);
    create index available_hours_rink_id_idx on available_hours (rink_id);

    create index water_sources_rink_id_idx on water_sources (rink_id);
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop index water_sources_rink_id_idx, available_hours_rink_id_idx;
    delete from available_hours a using available_hours b
      where a.rink_id = b.rink_id and a.from_local = b.from_local and a.id > b.id;
    alter table available_hours
      drop constraint available_hours_pkey, drop column id, drop column weekdays,
      add primary key (rink_id, from_local);
    alter table rinks
      drop column floor, drop column board_height_mm, drop column carries_skater_mm, drop column wind_limit_mps,
      drop column wind_chill_limit_c, drop column water_price_per_m3;
  `)
}
