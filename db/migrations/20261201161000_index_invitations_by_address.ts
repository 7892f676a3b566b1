// Whoever signs in without a rink is led to the invitation that waits for their address.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(
    'create index invitations_email_idx on invitations (email) where taken_at is null and withdrawn_at is null',
  )
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop index invitations_email_idx')
}
