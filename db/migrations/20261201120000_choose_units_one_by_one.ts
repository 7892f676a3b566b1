// Units one by one: somebody may read ice in inches and the air in °C.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table users
      add column unit_temperature text not null default 'C' check (unit_temperature in ('C', 'F')),
      -- Ice, layers, snow, rain and depths.
      add column unit_ice text not null default 'cm' check (unit_ice in ('cm', 'in')),
      add column unit_water text not null default 'L' check (unit_water in ('L', 'gal')),
      add column unit_size text not null default 'm' check (unit_size in ('m', 'ft')),
      add column unit_wind text not null default 'km/h' check (unit_wind in ('km/h', 'm/s', 'mph'));
    update users
      set unit_temperature = 'F', unit_ice = 'in', unit_water = 'gal', unit_size = 'ft', unit_wind = 'mph'
      where units = 'imperial';
    alter table users drop column units;
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table users add column units text not null default 'metric' check (units in ('metric', 'imperial'));
    update users set units = 'imperial' where unit_temperature = 'F';
    alter table users
      drop column unit_temperature, drop column unit_ice, drop column unit_water, drop column unit_size,
      drop column unit_wind;
  `)
}
