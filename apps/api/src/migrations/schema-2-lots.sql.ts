/** Lots, photos, frozen estimates, bids and buying terms. */
export const lotsSchema = `
create sequence lot_codes start 2401;

create table lots (
  id uuid primary key,
  code text not null unique default 'L-' || nextval('lot_codes'),
  seller_id uuid not null references members,
  state text not null default 'draft'
    check (state in ('draft', 'in_review', 'open', 'frozen', 'deciding', 'awarded', 'offered', 'unsold', 'withdrawn', 'deleted')),
  version integer not null default 1,
  draft jsonb not null,
  saved_at timestamptz not null default market_now(),
  created_at timestamptz not null default market_now(),
  -- set when the lot is listed, from the draft, and never changed afterwards
  title text,
  description text,
  form text check (form in ('open-bids', 'asking-price')),
  basis text check (basis = 'outright'),
  place text,
  country text,
  delivery_way text check (delivery_way in ('seller-sends', 'collection')),
  delivery_hours text,
  freight_minor bigint check (freight_minor between 0 and 99999999),
  start_minor bigint check (start_minor between 1 and 99999999),
  reserve_minor bigint check (reserve_minor between 1 and 99999999),
  asking_minor bigint check (asking_minor between 1 and 99999999),
  mass_g numeric(14, 3),
  mass_evidence text,
  pieces integer,
  class_codes text[],
  cover_photo_id uuid,
  listed_at timestamptz,
  first_closes_at timestamptz,
  closes_at timestamptz,
  latest_closes_at timestamptz,
  closed_at timestamptz,
  review_reason text,
  -- the auction; written only while the row is locked
  price_minor bigint,
  leader_id uuid references members,
  leader_ceiling_minor bigint,
  seq integer not null default 0,
  bidders integer not null default 0,
  constraint lots_listed_check check (
    state in ('draft', 'deleted', 'in_review')
    or (title is not null and form is not null and closes_at is not null and latest_closes_at is not null and mass_g > 0)
  ),
  constraint lots_closes_check check (closes_at <= latest_closes_at),
  constraint lots_price_check check (price_minor is null or leader_ceiling_minor is null or price_minor <= leader_ceiling_minor)
);
create index lots_seller_idx on lots (seller_id, saved_at desc);
create index lots_open_idx on lots (closes_at, id) where state = 'open';
create index lots_classes_idx on lots using gin (class_codes) where state = 'open';
create index lots_search_idx on lots using gin (to_tsvector('english', coalesce(title, '') || ' ' || coalesce(description, ''))) where state = 'open';

create table lot_lines (
  id uuid primary key,
  lot_id uuid not null references lots,
  position integer not null,
  label text not null,
  class_code text not null,
  mass_g numeric(14, 3),
  pieces integer,
  -- the line as described, in the shape of the contract's lineDraft
  input jsonb not null,
  unique (lot_id, position)
);

create table photos (
  id uuid primary key,
  owner_id uuid not null references members,
  lot_id uuid references lots,
  deal_id uuid,
  slot text not null default 'other',
  position integer not null default 0,
  description text not null default '',
  width integer not null,
  height integer not null,
  colour text not null,
  created_at timestamptz not null default market_now(),
  removed_at timestamptz
);
create index photos_lot_idx on photos (lot_id, position) where removed_at is null;

create table estimates (
  id uuid primary key,
  lot_id uuid not null unique references lots,
  frozen_at timestamptz not null default market_now(),
  model_version text not null,
  catalogue_version text not null references catalogue_versions,
  seed integer not null,
  draws integer not null,
  reference_price_id bigint not null references reference_prices,
  input jsonb not null,
  result jsonb not null,
  gold_p10_g double precision not null,
  gold_p50_g double precision not null,
  gold_p90_g double precision not null,
  grade_p50_g_per_t double precision not null
);

create table bids (
  id uuid primary key,
  lot_id uuid not null references lots,
  seq integer not null check (seq > 0),
  bidder_id uuid not null references members,
  ceiling_minor bigint not null check (ceiling_minor between 1 and 99999999),
  price_after_minor bigint not null,
  leader_after uuid not null references members,
  closes_after timestamptz not null,
  placed_at timestamptz not null,
  attempt uuid not null,
  constraint bids_lot_seq_key unique (lot_id, seq),
  constraint bids_attempt_key unique (bidder_id, attempt)
);
create index bids_bidder_idx on bids (bidder_id, lot_id, seq desc);

create table lot_aliases (
  lot_id uuid not null references lots,
  member_id uuid not null references members,
  number integer not null check (number > 0),
  primary key (lot_id, member_id),
  unique (lot_id, number)
);

create table under_offers (
  id uuid primary key,
  lot_id uuid not null references lots,
  buyer_id uuid not null references members,
  price_minor bigint not null check (price_minor between 1 and 99999999),
  answer_by timestamptz not null,
  answered_at timestamptz,
  accepted boolean,
  created_at timestamptz not null default market_now()
);
create unique index under_offers_live_key on under_offers (lot_id) where answered_at is null;

create table buying_terms (
  member_id uuid primary key references members,
  content jsonb not null,
  updated_at timestamptz not null default market_now()
);
`;
