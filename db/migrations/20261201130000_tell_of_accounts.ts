// Messages that try a channel out, that confirm a new address, and that tell of an account's end.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table messages drop constraint messages_kind_check;
    alter table messages add constraint messages_kind_check
      check (kind in ('flood-tonight', 'flood-changed', 'flood-closed', 'fill-check',
        'verify-address', 'sign-in-link', 'reset-password', 'address-already-registered',
        'test', 'change-address', 'deletion-asked'));

    alter table account_links
      -- The address that a link confirms, when it is another than the account's.
      add column new_email text check (new_email = lower(new_email) and length(new_email) <= 254),
      drop constraint account_links_purpose_check,
      add constraint account_links_purpose_check check (purpose in ('verify', 'sign-in', 'reset', 'change-email')),
      add check ((purpose = 'change-email') = (new_email is not null));
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    delete from messages where kind in ('test', 'change-address', 'deletion-asked');
    delete from account_links where purpose = 'change-email';
    alter table account_links
      drop column new_email, drop constraint account_links_purpose_check,
      add constraint account_links_purpose_check check (purpose in ('verify', 'sign-in', 'reset'));
    alter table messages drop constraint messages_kind_check;
    alter table messages add constraint messages_kind_check
      check (kind in ('flood-tonight', 'flood-changed', 'flood-closed', 'fill-check',
        'verify-address', 'sign-in-link', 'reset-password', 'address-already-registered'));
  `)
}
