// A theme, where a session is, and an account that is to be deleted.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table users
      add column theme text not null default 'system' check (theme in ('system', 'light', 'dark', 'dark-after-sunset')),
      -- The day on which the account goes for good; until then its owner may change their mind.
      add column deletion_due_at timestamptz;

    create index users_deletion_due_at_idx on users (deletion_due_at) where deletion_due_at is not null;

    alter table sessions
      -- The browser in words, for its owner's list; never more than its name and system.
      add column device text not null default '' check (length(device) <= 80),
      add column last_seen_at timestamptz not null default now();
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table sessions drop column device, drop column last_seen_at;
    alter table users
      drop column theme, drop column deletion_due_at;
  `)
}
