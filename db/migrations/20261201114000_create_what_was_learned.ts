// What came of each night that was advised, and what a yard's reports have taught the model.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    -- One row a night, written when it is over: what was said, and what weather and reports showed.
    create table night_outcomes (
      rink_id uuid not null references rinks on delete cascade,
      night_date date not null,
      said text not null check (said in ('fill', 'flood', 'hold')),
      -- The window as it stood when people were told, else as it last stood.
      window_id uuid references advised_windows on delete set null,
      starts_at timestamptz,
      ends_at timestamptz,
      set_by_at timestamptz,
      agreement double precision check (agreement between 0 and 1),
      result text not null check (result in ('kept', 'broken', 'unknown')),
      -- A person's report outranks the weather.
      source text not null check (source in ('report', 'weather', 'none')),
      detail jsonb not null default '{}',
      model_version text not null,
      settled_at timestamptz not null,
      check ((result = 'unknown') = (source = 'none')),
      primary key (rink_id, night_date)
    );

    create table yard_estimates (
      rink_id uuid primary key references rinks on delete cascade,
      estimated_at timestamptz not null,
      model_version text not null,
      is_learned boolean not null,
      shelter double precision not null check (shelter between 0 and 1),
      sky_view double precision not null check (sky_view between 0 and 1),
      reports smallint not null check (reports >= 0),
      -- Everything the page can say about it (lib/advice/yard).
      detail jsonb not null
    );
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table yard_estimates, night_outcomes')
}
