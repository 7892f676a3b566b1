// How people want to be told, what we promised to tell them, and every try at delivering it.
import type { Knex } from 'knex'

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table alert_preferences (
      rink_id uuid not null,
      user_id uuid not null,
      tell_at text not null default '15:30' check (tell_at ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'),
      wants_email boolean not null default true,
      wants_push boolean not null default true,
      -- Silent up to and including this night; null when not muted.
      muted_through date,
      updated_at timestamptz not null default now(),
      primary key (rink_id, user_id),
      foreign key (rink_id, user_id) references rink_members (rink_id, user_id) on delete cascade
    );

    create table push_subscriptions (
      id uuid primary key default gen_random_uuid(),
      user_id uuid not null references users on delete cascade,
      endpoint text not null check (endpoint like 'https://%' and length(endpoint) <= 1000),
      p256dh text not null,
      auth text not null,
      created_at timestamptz not null default now(),
      disabled_at timestamptz,
      disabled_reason text,
      unique (endpoint)
    );
    create index push_subscriptions_user_id_idx on push_subscriptions (user_id);

    create table messages (
      id uuid primary key default gen_random_uuid(),
      -- Why this message exists once, e.g. flood-tonight:{rinkId}:{nightDate}:{channel}:{userId}.
      dedupe_key text not null unique,
      user_id uuid not null references users on delete cascade,
      rink_id uuid references rinks on delete cascade,
      night_date date,
      channel text not null check (channel in ('email', 'push')),
      kind text not null check (kind in ('flood-tonight', 'flood-changed', 'flood-closed',
        'verify-address', 'sign-in-link', 'reset-password', 'address-already-registered')),
      -- Finished words for alerts; for account mail the id of the link, never its token.
      content jsonb not null,
      window_id uuid references advised_windows on delete set null,
      send_at timestamptz not null,
      expires_at timestamptz not null check (expires_at > send_at),
      state text not null default 'promised' check (state in ('promised', 'delivered', 'expired', 'dead')),
      settled_at timestamptz,
      created_at timestamptz not null,
      check ((state = 'promised') = (settled_at is null))
    );
    create index messages_promised_idx on messages (created_at) where state = 'promised';
    create index messages_user_night_idx on messages (user_id, rink_id, night_date);

    create table delivery_attempts (
      id bigint generated always as identity primary key,
      message_id uuid not null references messages on delete cascade,
      -- A push message has one attempt row per device; an e-mail has none.
      push_subscription_id uuid references push_subscriptions on delete set null,
      attempted_at timestamptz not null,
      outcome text not null check (outcome in ('delivered', 'temporary', 'permanent')),
      error text
    );
    create index delivery_attempts_message_id_idx on delivery_attempts (message_id);

    create table job_runs (
      job text not null,
      key text not null default '',
      last_started_at timestamptz not null,
      last_succeeded_at timestamptz,
      last_failed_at timestamptz,
      last_error text,
      primary key (job, key)
    );
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table job_runs, delivery_attempts, messages, push_subscriptions, alert_preferences')
}
