// Indexes behind the season's pages: fills and their sessions by rink, entries by who wrote them, messages by rink and kind.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create index fills_rink_id_idx on fills (rink_id, started_at desc);
    create index fill_sessions_fill_id_idx on fill_sessions (fill_id);
    create index log_entries_written_by_idx on log_entries (written_by);
    create index messages_rink_id_kind_idx on messages (rink_id, kind)
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(
    'drop index fills_rink_id_idx, fill_sessions_fill_id_idx, log_entries_written_by_idx, messages_rink_id_kind_idx',
  )
}
