// What an entry of the log tells of its yard, with the weather and the sheet it is held against: those are kept for days only.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table yard_reports (
      entry_id uuid primary key references log_entries on delete cascade,
      rink_id uuid not null references rinks on delete cascade,
      -- Of the entry; a change makes it new.
      entry_version integer not null,
      happened_at timestamptz not null,
      -- lib/advice/yard/types.ts
      report jsonb not null
    );
    create index yard_reports_rink_id_happened_at_idx on yard_reports (rink_id, happened_at)
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table yard_reports')
}
