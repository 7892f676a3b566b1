// The season's log: everything done at a rink, in one table, with its history. Floods move into it.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table log_entries (
      id uuid primary key default gen_random_uuid(),
      rink_id uuid not null references rinks on delete cascade,
      kind text not null check (kind in ('fill', 'flood', 'scrape', 'clear', 'repair', 'reading', 'thaw', 'note')),
      happened_at timestamptz not null,
      -- The night it belongs to, noon to noon at the rink.
      night_date date not null,
      -- Of a planned pass that was checked off.
      pass_number smallint check (pass_number between 1 and 20),
      layer_mm double precision check (layer_mm between 0.1 and 100),
      water_l double precision check (water_l > 0),
      water_temperature_c double precision check (water_temperature_c between 0 and 95),
      thickness_mm double precision check (thickness_mm between 0 and 2000),
      -- When the layer was said to be set, and what somebody found.
      said_set_by_at timestamptz,
      outcome text check (outcome in ('set', 'wet', 'spoiled')),
      outcome_at timestamptz,
      note text not null default '' check (length(note) <= 500),
      written_by uuid references users on delete set null,
      -- Made where the entry was written down: sent twice, it is kept once.
      entry_key uuid not null default gen_random_uuid(),
      version integer not null default 1 check (version > 0),
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      deleted_at timestamptz,
      check (kind = 'flood' or pass_number is null),
      check (kind <> 'flood' or (layer_mm is not null and water_l is not null and water_temperature_c is not null)),
      check (kind <> 'fill' or water_l is not null),
      check ((kind = 'reading') = (thickness_mm is not null)),
      check ((outcome is null) = (outcome_at is null)),
      check (outcome is null or kind = 'flood'),
      check (outcome_at >= happened_at),
      unique (rink_id, entry_key)
    );
    create unique index log_entries_pass_key on log_entries (rink_id, night_date, pass_number) where deleted_at is null;
    create index log_entries_rink_id_happened_at_idx on log_entries (rink_id, happened_at desc) where deleted_at is null;

    -- What an entry said before each change.
    create table log_revisions (
      entry_id uuid not null references log_entries on delete cascade,
      version integer not null check (version > 0),
      was jsonb not null,
      changed_by uuid references users on delete set null,
      changed_at timestamptz not null,
      primary key (entry_id, version)
    );

    insert into log_entries (id, rink_id, kind, happened_at, night_date, pass_number, layer_mm, water_l,
                             water_temperature_c, written_by, created_at, updated_at)
      select id, rink_id, 'flood', poured_at, night_date, pass_number, layer_mm, water_l,
             water_temperature_c, poured_by, created_at, created_at
        from floods;
    drop table floods;
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
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
    insert into floods (id, rink_id, night_date, pass_number, poured_at, layer_mm, water_l, water_temperature_c,
                        poured_by, created_at)
      select id, rink_id, night_date, pass_number, happened_at, layer_mm, water_l, water_temperature_c,
             written_by, created_at
        from log_entries where kind = 'flood' and pass_number is not null and deleted_at is null;
    drop table log_revisions, log_entries;
  `)
}
