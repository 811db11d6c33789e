/** Deals, payments, the ledger and settlements. */
export const moneySchema = `
create sequence deal_codes start 1001;

create table deals (
  id uuid primary key,
  code text not null unique default 'D-' || nextval('deal_codes'),
  lot_id uuid not null references lots,
  seller_id uuid not null references members,
  buyer_id uuid not null references members,
  state text not null default 'awaiting_payment'
    check (state in ('awaiting_payment', 'held', 'dispatched', 'ready', 'received', 'weighed_in', 'in_dispute', 'settling', 'needs_approval', 'settled', 'cancelled', 'refunded')),
  frozen_at timestamptz,
  price_minor bigint not null check (price_minor between 1 and 99999999),
  freight_minor bigint not null check (freight_minor between 0 and 99999999),
  buyer_fee_bp integer not null,
  seller_fee_bp integer not null,
  buyer_tax_bp integer not null default 0,
  seller_tax_bp integer not null default 0,
  hold_minor bigint not null check (hold_minor between 1 and 99999999),
  -- the deadline that runs now and what it is for; null when none runs
  due_kind text,
  due_from timestamptz,
  due_at timestamptz,
  -- the deadline stands still since then: a bank debit is on its way
  due_paused_at timestamptz,
  awarded_at timestamptz not null default market_now(),
  paid_at timestamptz,
  carrier text,
  tracking_code text,
  dispatched_at timestamptz,
  received_at timestamptz,
  weighed_in_at timestamptz,
  accepted_at timestamptz,
  settled_at timestamptz,
  ended_at timestamptz,
  updated_at timestamptz not null default market_now(),
  constraint deals_parties_check check (seller_id <> buyer_id)
);
create unique index deals_live_lot_key on deals (lot_id) where state <> 'cancelled';
create index deals_seller_idx on deals (seller_id, updated_at desc);
create index deals_buyer_idx on deals (buyer_id, updated_at desc);
create index deals_due_idx on deals (due_at) where due_at is not null and frozen_at is null and due_paused_at is null;

alter table photos add constraint photos_deal_fk foreign key (deal_id) references deals;

create table deal_events (
  id bigint generated always as identity primary key,
  deal_id uuid not null references deals,
  at timestamptz not null default market_now(),
  actor text not null check (actor in ('seller', 'buyer', 'market', 'desk')),
  actor_id uuid references members,
  kind text not null,
  detail jsonb not null default '{}'
);
create index deal_events_deal_idx on deal_events (deal_id, id);

create table weigh_ins (
  deal_id uuid primary key references deals,
  gross_g numeric(14, 3) not null check (gross_g > 0),
  tare_g numeric(14, 3) not null check (tare_g >= 0),
  net_g numeric(14, 3) not null check (net_g > 0 and net_g = gross_g - tare_g),
  scale_resolution_g numeric(12, 4) not null check (scale_resolution_g > 0),
  scale_serial text not null,
  note text not null,
  photo_ids uuid[] not null default '{}',
  -- null when nobody weighed in time and the declared mass stands
  entered_by uuid references members,
  at timestamptz not null default market_now(),
  countersigned_at timestamptz,
  claim_ends_at timestamptz not null,
  countersign_ends_at timestamptz not null
);

create table claims (
  deal_id uuid primary key references deals,
  ground text not null check (ground = 'mass'),
  declared_g numeric(14, 3) not null,
  found_g numeric(14, 3) not null,
  adjustment_minor bigint not null check (adjustment_minor > 0),
  at timestamptz not null default market_now(),
  accepted_at timestamptz
);

create table payments (
  id uuid primary key,
  deal_id uuid not null references deals,
  attempt integer not null,
  amount_minor bigint not null check (amount_minor > 0),
  state text not null default 'created' check (state in ('created', 'open', 'processing', 'failed', 'expired', 'succeeded', 'refunded')),
  session_id text unique,
  intent_id text unique,
  charge_id text unique,
  processor_fee_minor bigint,
  url text,
  message text not null default '',
  created_at timestamptz not null default market_now(),
  succeeded_at timestamptz,
  unique (deal_id, attempt)
);
create unique index payments_succeeded_key on payments (deal_id) where state = 'succeeded';

create table payout_accounts (
  member_id uuid primary key references members,
  account_id text not null unique,
  transfers_active boolean not null default false,
  payouts_enabled boolean not null default false,
  requirements text[] not null default '{}',
  updated_at timestamptz not null default market_now()
);

create table payouts (
  id text primary key,
  account_id text not null references payout_accounts (account_id),
  amount_minor bigint not null,
  state text not null check (state in ('pending', 'in_transit', 'paid', 'failed', 'cancelled')),
  at timestamptz not null
);
create index payouts_account_idx on payouts (account_id, at desc);

create table settlements (
  id uuid primary key,
  deal_id uuid not null unique references deals,
  value_minor bigint not null check (value_minor >= 0),
  freight_minor bigint not null,
  buyer_fee_minor bigint not null,
  seller_fee_minor bigint not null,
  buyer_tax_minor bigint not null,
  seller_tax_minor bigint not null,
  paid_in_minor bigint not null,
  seller_gets_minor bigint not null check (seller_gets_minor >= 0),
  refund_minor bigint not null check (refund_minor >= 0),
  adjustment_minor bigint not null check (adjustment_minor >= 0),
  steps jsonb not null,
  hash text not null,
  at timestamptz not null default market_now(),
  constraint settlements_sum_check check (
    paid_in_minor = seller_gets_minor + buyer_fee_minor + seller_fee_minor + buyer_tax_minor + seller_tax_minor + refund_minor
  )
);

create table transfers (
  id uuid primary key,
  settlement_id uuid not null references settlements,
  deal_id uuid not null references deals,
  member_id uuid not null references members,
  amount_minor bigint not null check (amount_minor > 0),
  state text not null check (state in ('waiting', 'queued', 'sent', 'failed')),
  reason text not null default '',
  transfer_id text unique,
  key text not null unique,
  sent_at timestamptz,
  unique (settlement_id, member_id)
);
create index transfers_deal_idx on transfers (deal_id);
create index transfers_member_idx on transfers (member_id) where state in ('waiting', 'queued');

create table refunds (
  id uuid primary key,
  deal_id uuid not null references deals,
  payment_id uuid not null references payments,
  amount_minor bigint not null check (amount_minor > 0),
  why text not null,
  state text not null default 'queued' check (state in ('queued', 'sent', 'failed')),
  reason text not null default '',
  refund_id text unique,
  key text not null unique,
  sent_at timestamptz
);
create index refunds_deal_idx on refunds (deal_id);
create index refunds_payment_idx on refunds (payment_id);

create table ledger_accounts (
  id bigint generated always as identity primary key,
  code text not null unique,
  currency text not null,
  normal text not null check (normal in ('D', 'C')),
  min_zero boolean not null,
  -- signed in the account's own sense: a debit account grows by debits
  balance bigint not null default 0,
  version integer not null default 0,
  constraint ledger_accounts_min_zero check (not min_zero or balance >= 0)
);

create table ledger_transfers (
  id uuid primary key,
  kind text not null,
  deal_id uuid references deals on delete restrict,
  idem_key text not null unique,
  event_at timestamptz not null,
  created_at timestamptz not null default clock_timestamp()
);

create table ledger_entries (
  id bigint generated always as identity primary key,
  transfer_id uuid not null references ledger_transfers on delete restrict,
  account_id bigint not null references ledger_accounts on delete restrict,
  currency text not null,
  -- debit positive, credit negative: the entries of a transfer add up to nought
  amount bigint not null check (amount <> 0),
  account_version integer not null,
  balance_after bigint not null,
  constraint ledger_entries_version_key unique (account_id, account_version)
);
create index ledger_entries_transfer_idx on ledger_entries (transfer_id);

-- Posting an entry moves its account's balance: the application cannot write balances by itself.
create function ledger_post_entry() returns trigger language plpgsql security definer set search_path = public as $$
declare account ledger_accounts;
begin
  update ledger_accounts a
     set balance = a.balance + case a.normal when 'D' then new.amount else -new.amount end, version = a.version + 1
   where a.id = new.account_id
  returning * into account;
  if not found then raise exception 'ledger: no account %', new.account_id using errcode = '23503'; end if;
  if account.currency <> new.currency then
    raise exception 'ledger: account % is kept in %, not in %', account.code, account.currency, new.currency using errcode = '23514';
  end if;
  new.account_version := account.version;
  new.balance_after := account.balance;
  return new;
end $$;
create trigger ledger_entries_post before insert on ledger_entries for each row execute function ledger_post_entry();

create function ledger_check_balanced() returns trigger language plpgsql security definer set search_path = public as $$
declare off record; entries integer; wanted uuid;
begin
  wanted := case tg_table_name when 'ledger_transfers' then (to_jsonb(new) ->> 'id')::uuid else (to_jsonb(new) ->> 'transfer_id')::uuid end;
  select currency, sum(amount) as total into off from ledger_entries where transfer_id = wanted group by currency having sum(amount) <> 0 limit 1;
  if found then
    raise exception 'ledger: transfer % is out of balance by % %', wanted, off.total, off.currency using errcode = '23514';
  end if;
  select count(*) into entries from ledger_entries where transfer_id = wanted;
  if entries < 2 then raise exception 'ledger: transfer % has fewer than two entries', wanted using errcode = '23514'; end if;
  return null;
end $$;
create constraint trigger ledger_entries_balanced after insert on ledger_entries
  deferrable initially deferred for each row execute function ledger_check_balanced();
create constraint trigger ledger_transfers_balanced after insert on ledger_transfers
  deferrable initially deferred for each row execute function ledger_check_balanced();

create function refuse_change() returns trigger language plpgsql as $$
begin raise exception '% is append only', tg_table_name using errcode = '42501'; end $$;
create trigger ledger_entries_frozen before update or delete on ledger_entries for each row execute function refuse_change();
create trigger ledger_transfers_frozen before update or delete on ledger_transfers for each row execute function refuse_change();
create trigger ledger_entries_kept before truncate on ledger_entries for each statement execute function refuse_change();
create trigger ledger_transfers_kept before truncate on ledger_transfers for each statement execute function refuse_change();
create trigger ledger_accounts_kept before delete on ledger_accounts for each row execute function refuse_change();
create trigger ledger_accounts_not_emptied before truncate on ledger_accounts for each statement execute function refuse_change();
create trigger audit_log_frozen before update or delete on audit_log for each row execute function refuse_change();
create trigger audit_log_kept before truncate on audit_log for each statement execute function refuse_change();
create trigger deal_events_frozen before update or delete on deal_events for each row execute function refuse_change();

grant usage on schema public to lydite_app;
grant select, insert, update, delete on all tables in schema public to lydite_app;
grant usage on all sequences in schema public to lydite_app;
revoke update, delete, truncate on ledger_entries, ledger_transfers, ledger_accounts, audit_log, deal_events, market_clock from lydite_app;
revoke insert on market_clock, ledger_accounts, ledger_entries from lydite_app;
-- An account opens empty, and an entry's running balance is the trigger's to write.
grant insert (code, currency, normal, min_zero) on ledger_accounts to lydite_app;
grant insert (transfer_id, account_id, currency, amount) on ledger_entries to lydite_app;
`;
