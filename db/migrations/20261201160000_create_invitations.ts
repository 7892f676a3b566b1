// Invitations to a rink, by mail.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table invitations (
      -- The mailed token is derived from the id and a server secret, so it is stored nowhere.
      id uuid primary key default gen_random_uuid(),
      rink_id uuid not null references rinks on delete cascade,
      email text not null check (email = lower(email) and email like '%_@_%' and length(email) <= 254),
      role text not null check (role in ('keeper', 'crew', 'skater')),
      -- Whoever goes takes their invitations along.
      invited_by uuid not null references users on delete cascade,
      created_at timestamptz not null,
      expires_at timestamptz not null check (expires_at > created_at),
      taken_at timestamptz,
      taken_by uuid references users on delete set null,
      withdrawn_at timestamptz,
      check (taken_at is null or withdrawn_at is null),
      check (taken_by is null or taken_at is not null)
    );
    create unique index invitations_standing_key on invitations (rink_id, email)
      where taken_at is null and withdrawn_at is null;
    create index invitations_invited_by_idx on invitations (invited_by);
    create index invitations_taken_by_idx on invitations (taken_by);
    create index invitations_expires_at_idx on invitations (expires_at);

    alter table messages drop constraint messages_kind_check;
    alter table messages add constraint messages_kind_check
      check (kind in ('flood-tonight', 'flood-changed', 'flood-closed', 'fill-check',
        'verify-address', 'sign-in-link', 'reset-password', 'address-already-registered',
        'test', 'change-address', 'address-changed', 'deletion-asked', 'rink-invitation'));
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    delete from messages where kind = 'rink-invitation';
    alter table messages drop constraint messages_kind_check;
    alter table messages add constraint messages_kind_check
      check (kind in ('flood-tonight', 'flood-changed', 'flood-closed', 'fill-check',
        'verify-address', 'sign-in-link', 'reset-password', 'address-already-registered',
        'test', 'change-address', 'address-changed', 'deletion-asked'));
    drop table invitations;
  `)
}
