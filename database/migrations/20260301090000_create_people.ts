import type { Knex } from 'knex';

/** People and how they sign in. Accounts are deactivated, never deleted. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    grant select on knex_migrations to bellgap_app;

    create table users (
      id uuid constraint users_pkey primary key default gen_random_uuid(),
      email text not null,
      name text not null,
      password_hash text,
      active boolean not null default true,
      is_demo boolean not null default false,
      lock_version integer not null default 1,
      created_at timestamptz not null default now(),
      deactivated_at timestamptz,
      constraint users_email_check check (email = btrim(email) and position('@' in email) > 1 and length(email) <= 254),
      constraint users_name_check check (length(btrim(name)) between 1 and 120),
      constraint users_deactivated_at_check check (active = (deactivated_at is null))
    );
    create unique index users_email_key on users (lower(email));
    comment on column users.password_hash is 'bcrypt of base64(SHA-256(password)); null until the invitation is used';
    comment on column users.is_demo is 'account of the demonstration; it may sign in only where the product listens on loopback';
    grant select, insert, update on users to bellgap_app;

    create table sessions (
      id uuid constraint sessions_pkey primary key default gen_random_uuid(),
      user_id uuid not null constraint sessions_user_id_fkey references users (id),
      created_at timestamptz not null default now(),
      last_active_at timestamptz not null default now(),
      expires_at timestamptz not null,
      ended_at timestamptz,
      address text,
      user_agent text,
      constraint sessions_expires_at_check check (expires_at > created_at)
    );
    create index sessions_user_id_index on sessions (user_id, created_at desc);
    create index sessions_expires_at_index on sessions (expires_at);
    comment on column sessions.last_active_at is 'last request made by the person; polling and timed saves do not count';
    grant select, insert, update, delete on sessions to bellgap_app;

    create table account_tokens (
      id uuid constraint account_tokens_pkey primary key default gen_random_uuid(),
      user_id uuid not null constraint account_tokens_user_id_fkey references users (id),
      purpose text not null constraint account_tokens_purpose_check check (purpose in ('invitation', 'reset')),
      token_hash text not null constraint account_tokens_token_hash_key unique,
      created_at timestamptz not null default now(),
      expires_at timestamptz not null,
      used_at timestamptz,
      constraint account_tokens_token_hash_check check (token_hash ~ '^[0-9a-f]{64}$'),
      constraint account_tokens_expires_at_check check (expires_at > created_at)
    );
    create index account_tokens_user_id_index on account_tokens (user_id);
    comment on column account_tokens.token_hash is 'SHA-256 of the token, hexadecimal; the token itself is never stored';
    grant select, insert, update, delete on account_tokens to bellgap_app;

    create table sign_in_attempts (
      id bigint generated always as identity constraint sign_in_attempts_pkey primary key,
      account text not null,
      address text not null,
      succeeded boolean not null,
      at timestamptz not null default now()
    );
    create index sign_in_attempts_account_index on sign_in_attempts (account, address, at);
    create index sign_in_attempts_address_index on sign_in_attempts (address, at);
    comment on table sign_in_attempts is 'counted to slow down guessing, by account and address and by address; old rows are removed';
    comment on column sign_in_attempts.account is 'e-mail address in lower case, also where no such account exists';
    grant select, insert, delete on sign_in_attempts to bellgap_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop table sign_in_attempts;
    drop table account_tokens;
    drop table sessions;
    drop table users;
    revoke select on knex_migrations from bellgap_app;
  `);
}
