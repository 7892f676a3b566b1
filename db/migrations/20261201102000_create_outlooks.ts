// Forecasts as fetched, and what the model made of them. Forecasts are kept: advice is judged by them later.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table forecasts (
      id uuid primary key default gen_random_uuid(),
      grid_cell_id uuid not null references grid_cells,
      provider text not null,
      -- One pull per cell and hour: two workers that race store one forecast.
      slot_at timestamptz not null check (slot_at = date_trunc('hour', slot_at)),
      issued_at timestamptz,
      fetched_at timestamptz not null,
      expires_at timestamptz not null check (expires_at > fetched_at),
      hours jsonb not null check (jsonb_typeof(hours) = 'array' and jsonb_array_length(hours) > 0),
      members jsonb check (members is null or jsonb_typeof(members) = 'array'),
      attribution jsonb not null,
      unique (grid_cell_id, slot_at)
    );

    create table outlooks (
      id uuid primary key default gen_random_uuid(),
      rink_id uuid not null references rinks on delete cascade,
      forecast_id uuid not null references forecasts,
      settings_version integer not null,
      model_version text not null,
      judged_at timestamptz not null,
      -- The hour it was judged in: the same forecast is judged again in the next hour when no newer one came.
      slot_at timestamptz not null check (slot_at = date_trunc('hour', slot_at)),
      time_zone text not null,
      -- Tonight, as the rink's zone counts it.
      night_date date not null,
      verdict text not null check (verdict in ('fill', 'flood', 'hold', 'unknown')),
      -- The night in data as it was decided on (lib/advice/night-summary.ts), and all windows, passes and thaws.
      summary jsonb not null,
      advice jsonb not null,
      unique (rink_id, forecast_id, settings_version, slot_at)
    );
    create index outlooks_rink_id_judged_at_idx on outlooks (rink_id, judged_at desc);
    create index outlooks_forecast_id_idx on outlooks (forecast_id);

    create table scored_hours (
      outlook_id uuid not null references outlooks on delete cascade,
      starts_at timestamptz not null check (starts_at = date_trunc('hour', starts_at)),
      is_known boolean not null,
      net_heat_loss_wm2 double precision,
      freeze_rate_mm_per_h double precision,
      wind_chill_c double precision,
      sets_at timestamptz check (sets_at >= starts_at),
      fill_score smallint not null check (fill_score between 0 and 100),
      flood_score smallint not null check (flood_score between 0 and 100),
      hold_score smallint not null check (hold_score between 0 and 100),
      verdict text not null check (verdict in ('fill', 'flood', 'hold')),
      reasons jsonb not null,
      -- Parts of the heat balance, weather, limits and sheet of the hour.
      detail jsonb not null,
      check (is_known or verdict = 'hold'),
      check (is_known = (net_heat_loss_wm2 is not null)),
      primary key (outlook_id, starts_at)
    );

    -- What was advised for a night. A change makes a new version; the newest version is what stands.
    create table advised_windows (
      id uuid primary key default gen_random_uuid(),
      rink_id uuid not null references rinks on delete cascade,
      night_date date not null,
      time_zone text not null,
      kind text not null check (kind in ('fill', 'flood')),
      version integer not null check (version > 0),
      state text not null check (state in ('open', 'closed')),
      outlook_id uuid references outlooks on delete set null,
      forecast_id uuid not null references forecasts,
      model_version text not null,
      advised_at timestamptz not null,
      starts_at timestamptz,
      ends_at timestamptz,
      latest_start_at timestamptz,
      set_by_at timestamptz,
      score smallint check (score between 0 and 100),
      agreement double precision check (agreement between 0 and 1),
      runs smallint check (runs > 0),
      passes jsonb not null default '[]',
      -- A closed version says why; an open one has its times.
      closed_reason jsonb,
      check ((state = 'open') = (starts_at is not null and ends_at is not null and set_by_at is not null and score is not null)),
      check (ends_at > starts_at),
      check (latest_start_at between starts_at and ends_at),
      unique (rink_id, night_date, kind, version)
    );
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table advised_windows, scored_hours, outlooks, forecasts')
}
