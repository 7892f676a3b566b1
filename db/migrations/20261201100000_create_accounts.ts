// People, their sessions, and the one-time links we mail them.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table users (
      id uuid primary key default gen_random_uuid(),
      email text not null check (email = lower(email) and email like '%_@_%' and length(email) <= 254),
      name text not null check (length(name) between 1 and 80),
      password_hash text,
      email_verified_at timestamptz,
      -- The mail server said for good that this address takes no mail; a link opened from a mail clears it.
      email_refused_at timestamptz,
      is_admin boolean not null default false,
      units text not null default 'metric' check (units in ('metric', 'imperial')),
      clock text not null default '12' check (clock in ('12', '24')),
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now()
    );
    create unique index users_email_key on users (email);

    -- Tokens are kept as SHA-256: a copy of this table signs nobody in.
    create table sessions (
      token_hash text primary key check (token_hash ~ '^[0-9a-f]{64}$'),
      user_id uuid not null references users on delete cascade,
      created_at timestamptz not null,
      expires_at timestamptz not null check (expires_at > created_at)
    );
    create index sessions_user_id_idx on sessions (user_id);
    create index sessions_expires_at_idx on sessions (expires_at);

    -- The mailed token is derived from the id and a server secret, so it is stored nowhere.
    create table account_links (
      id uuid primary key default gen_random_uuid(),
      user_id uuid not null references users on delete cascade,
      purpose text not null check (purpose in ('verify', 'sign-in', 'reset')),
      created_at timestamptz not null,
      expires_at timestamptz not null check (expires_at > created_at),
      used_at timestamptz
    );
    create index account_links_user_id_idx on account_links (user_id);

    -- Counted per fixed window; the key is a hash of what is limited (address, account), never the thing itself.
    create table rate_limits (
      key text not null,
      window_starts_at timestamptz not null,
      hits integer not null check (hits > 0),
      primary key (key, window_starts_at)
    );
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table rate_limits, account_links, sessions, users')
}
