// Reminders to look after the hose of a running fill are messages like any other.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table messages drop constraint messages_kind_check;
    alter table messages add constraint messages_kind_check
      check (kind in ('flood-tonight', 'flood-changed', 'flood-closed', 'fill-check',
        'verify-address', 'sign-in-link', 'reset-password', 'address-already-registered'));
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    delete from messages where kind = 'fill-check';
    alter table messages drop constraint messages_kind_check;
    alter table messages add constraint messages_kind_check
      check (kind in ('flood-tonight', 'flood-changed', 'flood-closed',
        'verify-address', 'sign-in-link', 'reset-password', 'address-already-registered'));
  `)
}
