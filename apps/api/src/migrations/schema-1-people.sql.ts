/** Members, sessions, notices, the audit log and the market's own records. */
export const peopleSchema = `
create table market_clock (
  one_row boolean primary key default true check (one_row),
  shift interval not null default interval '0'
);
insert into market_clock default values;
comment on table market_clock is 'Lets tests and simulations move the market''s time; the application may only read it.';

-- The one clock of the market. It reads the wall clock at the moment of the call, not at the start of the transaction.
create function market_now() returns timestamptz language sql volatile as
$$ select clock_timestamp() + (select shift from market_clock) $$;

create table holidays (day date primary key, name text not null);

create table members (
  id uuid primary key,
  email text not null check (email = lower(email)),
  password_hash text not null,
  name text not null,
  place text not null,
  email_confirmed_at timestamptz,
  verified_at timestamptz,
  verified_by uuid references members,
  limit_minor bigint not null default 200000 check (limit_minor between 0 and 99999999),
  tax_bp integer not null default 0 check (tax_bp between 0 and 10000),
  suspended_at timestamptz,
  created_at timestamptz not null default market_now(),
  constraint members_email_key unique (email)
);

create table member_roles (
  member_id uuid not null references members,
  role text not null check (role in ('seller', 'buyer', 'assayer', 'operator')),
  granted_by uuid references members,
  granted_at timestamptz not null default market_now(),
  primary key (member_id, role)
);

create table mail_tokens (
  id uuid primary key,
  member_id uuid not null references members,
  purpose text not null check (purpose in ('confirm', 'reset')),
  token_hash text not null unique,
  expires_at timestamptz not null,
  used_at timestamptz
);

create table sessions (
  id uuid primary key,
  member_id uuid not null references members,
  device text not null,
  ip text not null,
  created_at timestamptz not null default market_now(),
  last_seen_at timestamptz not null default market_now(),
  idle_until timestamptz not null,
  abs_until timestamptz not null,
  fresh_until timestamptz not null,
  revoked_at timestamptz,
  revoked_why text
);
create index sessions_member_idx on sessions (member_id) where revoked_at is null;

-- Each renewal issues a successor; a predecessor stays good until its successor is used, after that its reuse revokes the session.
create table refresh_tokens (
  hash text primary key,
  session_id uuid not null references sessions on delete cascade,
  parent_hash text references refresh_tokens on delete cascade,
  created_at timestamptz not null default market_now(),
  used_at timestamptz,
  spent_at timestamptz
);
create index refresh_tokens_session_idx on refresh_tokens (session_id);

create table sign_in_failures (
  id bigint generated always as identity primary key,
  key text not null,
  at timestamptz not null default market_now()
);
create index sign_in_failures_key_idx on sign_in_failures (key, at desc);

create table member_totp (
  member_id uuid primary key references members,
  secret bytea not null,
  begun_at timestamptz not null default market_now(),
  confirmed_at timestamptz,
  last_step bigint
);
comment on column member_totp.secret is 'Encrypted by a key of the settings, bound to the member.';
comment on column member_totp.last_step is 'The newest 30-second step whose code was used: no code counts twice.';

create table recovery_codes (
  hash text primary key,
  member_id uuid not null references members,
  used_at timestamptz
);
create index recovery_codes_member_idx on recovery_codes (member_id);

create table notices (
  id uuid primary key,
  member_id uuid not null references members,
  kind text not null,
  key text not null unique,
  subject text not null,
  text text not null,
  link text not null,
  created_at timestamptz not null default market_now(),
  read_at timestamptz,
  mailed_at timestamptz
);
create index notices_member_idx on notices (member_id, created_at desc);

create table audit_log (
  id bigint generated always as identity primary key,
  at timestamptz not null default market_now(),
  actor_id uuid,
  session_id uuid,
  ip text,
  action text not null,
  object_kind text not null,
  object_id text not null,
  reason text not null default '',
  request_id text
);

create table fee_schedules (
  from_day date primary key,
  buyer_fee_bp integer not null check (buyer_fee_bp between 0 and 10000),
  seller_fee_bp integer not null check (seller_fee_bp between 0 and 10000)
);
-- the fees of rules.md: in force until a dated change
insert into fee_schedules (from_day, buyer_fee_bp, seller_fee_bp) values ('2000-01-01', 200, 400);

create table catalogue_versions (
  version text primary key,
  content jsonb not null,
  in_force boolean not null default false,
  created_at timestamptz not null default market_now()
);
create unique index catalogue_in_force_key on catalogue_versions (in_force) where in_force;

create table reference_prices (
  id bigint generated always as identity primary key,
  at timestamptz not null,
  source text not null,
  currency text not null,
  per_gram_minor numeric(14, 4) not null check (per_gram_minor > 0),
  fetched_at timestamptz not null default market_now(),
  unique (source, at)
);
create index reference_prices_at_idx on reference_prices (at desc);

create table outbox (
  id bigint generated always as identity primary key,
  kind text not null,
  key text not null unique,
  payload jsonb not null,
  state text not null default 'pending' check (state in ('pending', 'done', 'dead')),
  attempts integer not null default 0,
  next_at timestamptz not null default clock_timestamp(),
  last_error text,
  first_tried_at timestamptz,
  created_at timestamptz not null default market_now(),
  done_at timestamptz
);
create index outbox_due_idx on outbox (next_at, id) where state = 'pending';

create table inbox (
  event_id text primary key,
  kind text not null,
  account_id text,
  object_id text not null,
  payload jsonb not null,
  received_at timestamptz not null default market_now(),
  processed_at timestamptz,
  attempts integer not null default 0,
  next_at timestamptz not null default clock_timestamp(),
  last_error text
);
create index inbox_due_idx on inbox (next_at) where processed_at is null;
`;
