// Rinks, who belongs to them, their water, and when their people can go out.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table grid_cells (
      id uuid primary key default gen_random_uuid(),
      latitude_deg double precision not null check (latitude_deg between -90 and 90),
      longitude_deg double precision not null check (longitude_deg between -180 and 180),
      last_tried_at timestamptz,
      last_error text,
      retry_at timestamptz,
      unique (latitude_deg, longitude_deg)
    );

    create table rinks (
      id uuid primary key default gen_random_uuid(),
      name text not null check (length(name) between 1 and 60),
      place_name text not null check (length(place_name) between 1 and 120),
      latitude_deg double precision not null check (latitude_deg between -90 and 90),
      longitude_deg double precision not null check (longitude_deg between -180 and 180),
      grid_cell_id uuid not null references grid_cells,
      time_zone text not null check (length(time_zone) between 3 and 64),
      length_m double precision not null check (length_m between 2 and 100),
      width_m double precision not null check (width_m between 2 and 100),
      base text not null check (base in ('liner', 'ground', 'snow')),
      phase text not null check (phase in ('planning', 'waiting', 'filling', 'freezing', 'skating', 'thaw', 'closed')),
      shelter text not null check (shelter in ('open', 'suburban', 'tight')),
      sky_view double precision not null check (sky_view between 0 and 1),
      max_passes smallint not null default 3 check (max_passes between 1 and 6),
      -- Counts every change that the advice depends on, so that an outlook knows what it was made for.
      settings_version integer not null default 1 check (settings_version > 0),
      -- A set-up form sent twice makes one rink.
      created_by uuid references users on delete set null,
      creation_key uuid not null,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      unique (created_by, creation_key)
    );
    create index rinks_grid_cell_id_idx on rinks (grid_cell_id);

    create table rink_members (
      rink_id uuid not null references rinks on delete cascade,
      user_id uuid not null references users on delete cascade,
      role text not null check (role in ('keeper', 'crew', 'skater')),
      joined_at timestamptz not null default now(),
      primary key (rink_id, user_id)
    );
    create index rink_members_user_id_idx on rink_members (user_id);

    create table water_sources (
      id uuid primary key default gen_random_uuid(),
      rink_id uuid not null references rinks on delete cascade,
      kind text not null check (kind in ('cold-tap', 'hot-tap', 'hydrant', 'tanker')),
      flow_l_per_min double precision not null check (flow_l_per_min between 1 and 400),
      temperature_c double precision not null check (temperature_c between 0 and 95),
      layer_mm double precision not null check (layer_mm between 0.5 and 30),
      fill_depth_mm double precision not null check (fill_depth_mm between 20 and 1000),
      is_default boolean not null default true
    );
    create unique index water_sources_default_key on water_sources (rink_id) where is_default;

    -- Local wall time in the rink's zone; "to" before "from" runs past midnight.
    create table available_hours (
      rink_id uuid not null references rinks on delete cascade,
      from_local text not null check (from_local ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'),
      to_local text not null check (to_local ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$' and to_local <> from_local),
      primary key (rink_id, from_local)
    );

    -- The sheet as somebody saw it, or as the model carried it; the newest row at or before an hour is where a run starts.
    create table sheet_states (
      rink_id uuid not null references rinks on delete cascade,
      as_of timestamptz not null,
      origin text not null check (origin in ('reported', 'modelled')),
      model_version text,
      thickness_mm double precision not null check (thickness_mm between 0 and 2000),
      temperature_c double precision not null check (temperature_c between -60 and 0),
      snow_cover_cm double precision not null check (snow_cover_cm between 0 and 300),
      state jsonb,
      check (origin = 'reported' or (state is not null and model_version is not null)),
      primary key (rink_id, as_of)
    );

    create table floods (
      id uuid primary key default gen_random_uuid(),
      rink_id uuid not null references rinks on delete cascade,
      night_date date not null,
      pass_number smallint not null check (pass_number between 1 and 20),
      poured_at timestamptz not null,
      layer_mm double precision not null check (layer_mm between 0.1 and 100),
      water_l double precision not null check (water_l > 0),
      water_temperature_c double precision not null check (water_temperature_c between 0 and 95),
      poured_by uuid references users on delete set null,
      created_at timestamptz not null default now(),
      unique (rink_id, night_date, pass_number)
    );
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table floods, sheet_states, available_hours, water_sources, rink_members, rinks, grid_cells')
}
