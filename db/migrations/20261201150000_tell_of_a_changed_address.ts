// A note to the address that an account had: whoever takes an account over shall not do so unseen.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table messages drop constraint messages_kind_check;
    alter table messages add constraint messages_kind_check
      check (kind in ('flood-tonight', 'flood-changed', 'flood-closed', 'fill-check',
        'verify-address', 'sign-in-link', 'reset-password', 'address-already-registered',
        'test', 'change-address', 'address-changed', 'deletion-asked'));
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    delete from messages where kind = 'address-changed';
    alter table messages drop constraint messages_kind_check;
    alter table messages add constraint messages_kind_check
      check (kind in ('flood-tonight', 'flood-changed', 'flood-closed', 'fill-check',
        'verify-address', 'sign-in-link', 'reset-password', 'address-already-registered',
        'test', 'change-address', 'deletion-asked'));
  `)
}
