// A fill that was given up leaves its water in the log and none on the rink.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`alter table fills add column given_up boolean not null default false`)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`alter table fills drop column given_up`)
}
