// Messages about a thaw ahead.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table messages drop constraint messages_kind_check;
    alter table messages add constraint messages_kind_check
      check (kind in ('flood-tonight', 'flood-changed', 'flood-closed', 'fill-check',
        'fill-ahead', 'fill-changed', 'fill-closed', 'thaw-ahead',
        'verify-address', 'sign-in-link', 'reset-password', 'address-already-registered',
        'test', 'change-address', 'address-changed', 'deletion-asked', 'rink-invitation'));
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    delete from messages where kind = 'thaw-ahead';
    alter table messages drop constraint messages_kind_check;
    alter table messages add constraint messages_kind_check
      check (kind in ('flood-tonight', 'flood-changed', 'flood-closed', 'fill-check',
        'fill-ahead', 'fill-changed', 'fill-closed',
        'verify-address', 'sign-in-link', 'reset-password', 'address-already-registered',
        'test', 'change-address', 'address-changed', 'deletion-asked', 'rink-invitation'));
  `)
}
