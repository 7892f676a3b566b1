// A fill while it runs: its hose sessions, and what somebody saw when looking after it.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table fills (
      id uuid primary key default gen_random_uuid(),
      rink_id uuid not null references rinks on delete cascade,
      started_at timestamptz not null,
      started_by uuid references users on delete set null,
      -- Mean depth of water wanted.
      target_depth_mm double precision not null check (target_depth_mm between 20 and 1000),
      finished_at timestamptz check (finished_at >= started_at)
    );
    create unique index fills_open_key on fills (rink_id) where finished_at is null;

    create table fill_sessions (
      id uuid primary key default gen_random_uuid(),
      fill_id uuid not null references fills on delete cascade,
      started_at timestamptz not null,
      stopped_at timestamptz check (stopped_at > started_at),
      flow_l_per_min double precision not null check (flow_l_per_min between 1 and 400)
    );
    create unique index fill_sessions_open_key on fill_sessions (fill_id) where stopped_at is null;

    create table fill_checks (
      id uuid primary key default gen_random_uuid(),
      fill_id uuid not null references fills on delete cascade,
      checked_at timestamptz not null,
      checked_by uuid references users on delete set null,
      -- Water over the lowest corner, when somebody measured it.
      low_corner_depth_mm double precision check (low_corner_depth_mm between 0 and 1500),
      note text not null default '' check (length(note) <= 500),
      unique (fill_id, checked_at)
    );
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table fill_checks, fill_sessions, fills')
}
