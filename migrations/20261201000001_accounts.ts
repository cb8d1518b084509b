import { type Knex } from 'knex';

/** People, crews, who belongs where, sign-in. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table users (
      id uuid constraint users_pkey primary key,
      name text not null constraint users_name_length check (char_length(name) between 1 and 200),
      email text not null constraint users_email_length check (char_length(email) between 3 and 254),
      password_hash text not null,
      session_epoch integer not null default 1,
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now()
    );
    create unique index users_email_unique on users (lower(email));
    comment on column users.session_epoch is 'One more, and every session of the person ends';

    create table crews (
      id uuid constraint crews_pkey primary key,
      name text not null constraint crews_name_length check (char_length(name) between 1 and 200),
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now()
    );

    create table memberships (
      crew_id uuid not null constraint memberships_crew_fkey references crews (id) on delete cascade,
      user_id uuid not null constraint memberships_user_fkey references users (id) on delete cascade,
      role text not null constraint memberships_role_known check (role in ('lead', 'operator', 'editor', 'reviewer')),
      created_at timestamptz not null default now(),
      updated_at timestamptz not null default now(),
      constraint memberships_pkey primary key (crew_id, user_id)
    );
    create index memberships_user_index on memberships (user_id);

    create table sessions (
      sid text constraint sessions_pkey primary key,
      sess json not null,
      expire timestamptz not null
    );
    create index sessions_expire_index on sessions (expire);

    create table rate_limits (
      key text constraint rate_limits_pkey primary key,
      points integer not null default 0,
      expire bigint
    );
    create index rate_limits_expire_index on rate_limits (expire);

    create table audit_events (
      id bigint generated always as identity constraint audit_events_pkey primary key,
      at timestamptz not null default now(),
      crew_id uuid constraint audit_events_crew_fkey references crews (id) on delete cascade,
      user_id uuid constraint audit_events_user_fkey references users (id) on delete set null,
      action text not null,
      subject_id uuid,
      detail jsonb not null default '{}'
    );
    create index audit_events_crew_index on audit_events (crew_id, id);
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table audit_events, rate_limits, sessions, memberships, crews, users');
}
