// Indexes for tables that are never pruned: without them every judgement, every pruned outlook and every look at
// api/health would read all of a table that grows for years.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create index messages_rink_id_night_date_idx on messages (rink_id, night_date);
    create index messages_dead_idx on messages (settled_at) where state = 'dead';
    create index advised_windows_outlook_id_idx on advised_windows (outlook_id);
    create index delivery_attempts_push_subscription_id_idx on delivery_attempts (push_subscription_id);
    create index forecasts_fetched_at_idx on forecasts (fetched_at);
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop index messages_rink_id_night_date_idx, messages_dead_idx, advised_windows_outlook_id_idx,
      delivery_attempts_push_subscription_id_idx, forecasts_fetched_at_idx
  `)
}
