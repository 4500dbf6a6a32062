import type { QueryInterface } from "sequelize";

/** People, sessions, markets, the week's supply and claims, preorders, pickups, notebook. Constraints carry the promises. */
export const up = ({ context }: { context: QueryInterface }) => context.sequelize.query(sql);

const sql = /* sql */ `
CREATE DOMAIN wall_time AS text CHECK (VALUE ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$');
CREATE DOMAIN slug AS text CHECK (VALUE ~ '^[a-z0-9]+(-[a-z0-9]+)*$' AND length(VALUE) <= 60);
CREATE DOMAIN monday AS date CHECK (EXTRACT(ISODOW FROM VALUE) = 1);

CREATE TABLE demo_clock (
  id smallint PRIMARY KEY DEFAULT 1 CHECK (id = 1),
  offset_ms bigint NOT NULL
);

CREATE TABLE farm (
  id smallint PRIMARY KEY DEFAULT 1 CHECK (id = 1),
  name text NOT NULL CHECK (name <> ''),
  tagline text NOT NULL,
  story text NOT NULL,
  street text NOT NULL, town text NOT NULL, region text NOT NULL, postcode text NOT NULL, country text NOT NULL,
  email text NOT NULL, phone text NOT NULL,
  time_zone text NOT NULL,
  currency char(3) NOT NULL CHECK (currency ~ '^[A-Z]{3}$'),
  distance_unit text NOT NULL CHECK (distance_unit IN ('mi', 'km')),
  close_rule jsonb NOT NULL,
  minimum_order_minor integer NOT NULL CHECK (minimum_order_minor >= 0),
  prices_include_tax boolean NOT NULL,
  cash_rounding_minor integer NOT NULL CHECK (cash_rounding_minor >= 1),
  version integer NOT NULL DEFAULT 1
);

CREATE TABLE person (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  email text NOT NULL UNIQUE CHECK (email = lower(email) AND length(email) <= 254),
  name text NOT NULL DEFAULT '',
  phone text NOT NULL DEFAULT '',
  role text NOT NULL CHECK (role IN ('shopper', 'stall', 'grower', 'owner')),
  if_missing text NOT NULL DEFAULT 'similar' CHECK (if_missing IN ('similar', 'credit', 'money_back')),
  invited_at timestamptz(3), first_seen_at timestamptz(3),
  created_at timestamptz(3) NOT NULL
);

CREATE TABLE session (
  sid text PRIMARY KEY,
  sess json NOT NULL,
  expire timestamptz(3) NOT NULL,
  person_id uuid GENERATED ALWAYS AS ((sess #>> '{passport,user}')::uuid) STORED
);
CREATE INDEX session_expire ON session (expire);
CREATE INDEX session_person ON session (person_id);

CREATE TABLE sign_in_request (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  token_hash bytea NOT NULL UNIQUE,
  code_hash bytea NOT NULL,
  email text NOT NULL,
  next_path text NOT NULL,
  tries smallint NOT NULL DEFAULT 0 CHECK (tries BETWEEN 0 AND 5),
  created_at timestamptz(3) NOT NULL,
  expires_at timestamptz(3) NOT NULL,
  used_at timestamptz(3)
);

CREATE TABLE idempotency_key (
  scope text NOT NULL, key text NOT NULL,
  request_hash bytea NOT NULL,
  answer jsonb,
  created_at timestamptz(3) NOT NULL,
  PRIMARY KEY (scope, key)
);

CREATE TABLE file (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  sha256 text NOT NULL UNIQUE CHECK (sha256 ~ '^[0-9a-f]{64}$'),
  mime text NOT NULL CHECK (mime IN ('image/webp')),
  bytes bytea NOT NULL,
  width integer NOT NULL, height integer NOT NULL,
  added_by uuid NOT NULL REFERENCES person,
  created_at timestamptz(3) NOT NULL
);

CREATE TABLE market (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  slug slug NOT NULL UNIQUE,
  name text NOT NULL CHECK (name <> ''),
  street text NOT NULL, town text NOT NULL, region text NOT NULL, postcode text NOT NULL,
  lat double precision NOT NULL CHECK (lat BETWEEN -90 AND 90),
  lng double precision NOT NULL CHECK (lng BETWEEN -180 AND 180),
  stall text NOT NULL, directions text NOT NULL,
  awning jsonb NOT NULL,
  tax_rate_ppm integer NOT NULL DEFAULT 0 CHECK (tax_rate_ppm BETWEEN 0 AND 500000),
  retired_at timestamptz(3),
  version integer NOT NULL DEFAULT 1
);
CREATE TABLE market_opening (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  market_id uuid NOT NULL REFERENCES market ON DELETE CASCADE,
  rrule text NOT NULL,
  starts_on date NOT NULL, ends_on date,
  start_time wall_time NOT NULL, end_time wall_time NOT NULL, CHECK (end_time > start_time),
  except_on date[] NOT NULL DEFAULT '{}', extra_on date[] NOT NULL DEFAULT '{}'
);
CREATE TABLE market_day (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  market_id uuid NOT NULL REFERENCES market,
  on_day date NOT NULL,
  start_time wall_time NOT NULL, end_time wall_time NOT NULL, CHECK (end_time > start_time),
  status text NOT NULL DEFAULT 'on' CHECK (status IN ('on', 'late', 'moved', 'called_off')),
  status_note text NOT NULL DEFAULT '',
  closes_at timestamptz(3) NOT NULL,
  closed_at timestamptz(3),
  ended_at timestamptz(3),
  reminded_at timestamptz(3),
  version integer NOT NULL DEFAULT 1,
  UNIQUE (id, on_day),
  UNIQUE (market_id, on_day)
);
CREATE INDEX market_day_on ON market_day (on_day);
CREATE INDEX market_day_to_close ON market_day (closes_at) WHERE closed_at IS NULL;
CREATE TABLE roster (
  market_day_id uuid NOT NULL REFERENCES market_day ON DELETE CASCADE,
  person_id uuid NOT NULL REFERENCES person ON DELETE CASCADE,
  PRIMARY KEY (market_day_id, person_id)
);

CREATE TABLE variety (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  slug slug NOT NULL UNIQUE,
  name text NOT NULL UNIQUE CHECK (name <> ''),
  kind text NOT NULL CHECK (kind IN ('lettuce', 'herb', 'leafy_green', 'allium')),
  blurb text NOT NULL, keeping text NOT NULL,
  drawing jsonb NOT NULL,
  retired_at timestamptz(3),
  version integer NOT NULL DEFAULT 1
);
CREATE TABLE product (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  slug slug NOT NULL UNIQUE,
  name text NOT NULL UNIQUE CHECK (name <> ''),
  unit text NOT NULL CHECK (unit IN ('head', 'bunch', 'bag')),
  blurb text NOT NULL,
  price_minor integer NOT NULL CHECK (price_minor >= 0),
  retired_at timestamptz(3),
  version integer NOT NULL DEFAULT 1
);
CREATE TABLE product_part (
  product_id uuid NOT NULL REFERENCES product ON DELETE CASCADE,
  variety_id uuid NOT NULL REFERENCES variety,
  form text NOT NULL CHECK (form IN ('head', 'bunch')),
  grade text NOT NULL CHECK (grade IN ('full', 'small')),
  units integer NOT NULL CHECK (units > 0),
  PRIMARY KEY (product_id, variety_id, form, grade)
);

CREATE TABLE week (
  starts_on monday PRIMARY KEY,
  note text NOT NULL DEFAULT '',
  posted_at timestamptz(3),
  version integer NOT NULL DEFAULT 1
);
CREATE TABLE supply_line (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  week_starts_on monday NOT NULL REFERENCES week,
  variety_id uuid NOT NULL REFERENCES variety,
  form text NOT NULL CHECK (form IN ('head', 'bunch')),
  grade text NOT NULL CHECK (grade IN ('full', 'small')),
  sown_from date, sown_to date,
  CHECK ((sown_from IS NULL) = (sown_to IS NULL)), CHECK (sown_from <= sown_to), CHECK (sown_to < week_starts_on + 7),
  UNIQUE (week_starts_on, variety_id, form, grade)
);
CREATE TABLE supply_day (
  line_id uuid NOT NULL REFERENCES supply_line ON DELETE CASCADE,
  on_day date NOT NULL,
  promised integer NOT NULL CHECK (promised >= 0),
  claimed integer NOT NULL DEFAULT 0 CHECK (claimed >= 0),
  broken integer NOT NULL DEFAULT 0 CHECK (broken >= 0),
  PRIMARY KEY (line_id, on_day),
  CHECK (claimed <= promised + broken),
  CHECK (broken = 0 OR claimed = promised + broken)
);
CREATE TABLE supply_change (
  id bigint GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
  line_id uuid NOT NULL REFERENCES supply_line ON DELETE CASCADE,
  from_day date NOT NULL,
  delta integer NOT NULL CHECK (delta <> 0),
  reason text NOT NULL CHECK (reason IN ('post', 'edit', 'lost', 'late', 'returned')),
  by_person uuid REFERENCES person,
  at timestamptz(3) NOT NULL
);
CREATE INDEX supply_change_line ON supply_change (line_id);
CREATE TABLE offer (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  week_starts_on monday NOT NULL REFERENCES week,
  product_id uuid NOT NULL REFERENCES product,
  price_minor integer NOT NULL CHECK (price_minor >= 0),
  UNIQUE (week_starts_on, product_id)
);
CREATE TABLE offer_part (
  offer_id uuid NOT NULL REFERENCES offer ON DELETE CASCADE,
  line_id uuid NOT NULL REFERENCES supply_line,
  units integer NOT NULL CHECK (units > 0),
  PRIMARY KEY (offer_id, line_id)
);
CREATE TABLE offer_day (
  offer_id uuid NOT NULL REFERENCES offer ON DELETE CASCADE,
  market_day_id uuid NOT NULL REFERENCES market_day,
  max_units integer CHECK (max_units >= 0),
  taken integer NOT NULL DEFAULT 0 CHECK (taken >= 0),
  PRIMARY KEY (offer_id, market_day_id),
  CHECK (max_units IS NULL OR taken <= max_units)
);
CREATE INDEX offer_day_day ON offer_day (market_day_id);
CREATE TABLE claim (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  market_day_id uuid NOT NULL, on_day date NOT NULL,
  line_id uuid NOT NULL,
  kind text NOT NULL CHECK (kind IN ('preorder', 'hold', 'box', 'walk_up', 'spent')),
  ref uuid NOT NULL,
  units integer NOT NULL CHECK (units > 0),
  FOREIGN KEY (market_day_id, on_day) REFERENCES market_day (id, on_day),
  FOREIGN KEY (line_id, on_day) REFERENCES supply_day (line_id, on_day),
  UNIQUE (kind, ref, line_id, market_day_id)
);
CREATE INDEX claim_line ON claim (line_id);
CREATE INDEX claim_day ON claim (market_day_id);

CREATE TABLE pickup (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  person_id uuid NOT NULL REFERENCES person,
  market_day_id uuid NOT NULL REFERENCES market_day,
  code text NOT NULL CHECK (code ~ '^[A-Z0-9]{3}$'),
  pass_key text NOT NULL UNIQUE CHECK (length(pass_key) >= 22),
  frozen_at timestamptz(3),
  packed_at timestamptz(3), packed_by uuid REFERENCES person,
  missed_at timestamptz(3),
  UNIQUE (person_id, market_day_id),
  UNIQUE (market_day_id, code)
);
CREATE TABLE preorder (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  pickup_id uuid NOT NULL REFERENCES pickup,
  person_id uuid NOT NULL REFERENCES person,
  market_day_id uuid NOT NULL REFERENCES market_day,
  state text NOT NULL CHECK (state IN ('placed', 'cancelled')),
  name text NOT NULL CHECK (name <> ''), phone text NOT NULL, collector text NOT NULL,
  if_missing text NOT NULL CHECK (if_missing IN ('similar', 'credit', 'money_back')),
  note text NOT NULL,
  tax_rate_ppm integer NOT NULL CHECK (tax_rate_ppm >= 0),
  prices_include_tax boolean NOT NULL,
  subtotal_minor integer NOT NULL CHECK (subtotal_minor >= 0),
  tax_minor integer NOT NULL CHECK (tax_minor >= 0),
  total_minor integer NOT NULL CHECK (total_minor >= 0),
  currency char(3) NOT NULL,
  placed_at timestamptz(3) NOT NULL, changed_at timestamptz(3), cancelled_at timestamptz(3),
  cancel_reason text NOT NULL DEFAULT '',
  version integer NOT NULL DEFAULT 1,
  CHECK ((state = 'cancelled') = (cancelled_at IS NOT NULL)),
  CHECK (total_minor = subtotal_minor + CASE WHEN prices_include_tax THEN 0 ELSE tax_minor END)
);
CREATE INDEX preorder_pickup ON preorder (pickup_id);
CREATE INDEX preorder_person ON preorder (person_id, placed_at DESC);
CREATE INDEX preorder_day ON preorder (market_day_id);
CREATE TABLE preorder_line (
  preorder_id uuid NOT NULL REFERENCES preorder ON DELETE CASCADE,
  offer_id uuid NOT NULL REFERENCES offer,
  product_name text NOT NULL, unit text NOT NULL,
  units integer NOT NULL CHECK (units > 0),
  price_minor integer NOT NULL CHECK (price_minor >= 0),
  PRIMARY KEY (preorder_id, offer_id)
);
CREATE INDEX preorder_line_offer ON preorder_line (offer_id);

CREATE TABLE check_off (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  pickup_id uuid NOT NULL REFERENCES pickup,
  kind text NOT NULL CHECK (kind IN ('collected', 'part')),
  note text NOT NULL DEFAULT '',
  by_person uuid NOT NULL REFERENCES person,
  at timestamptz(3) NOT NULL,
  undone_at timestamptz(3), undone_by uuid REFERENCES person,
  CHECK ((undone_at IS NULL) = (undone_by IS NULL))
);
CREATE UNIQUE INDEX check_off_once ON check_off (pickup_id) WHERE undone_at IS NULL;
CREATE TABLE check_off_line (
  check_off_id uuid NOT NULL REFERENCES check_off ON DELETE CASCADE,
  preorder_id uuid NOT NULL, offer_id uuid NOT NULL,
  units integer NOT NULL CHECK (units >= 0),
  PRIMARY KEY (check_off_id, preorder_id, offer_id),
  FOREIGN KEY (preorder_id, offer_id) REFERENCES preorder_line (preorder_id, offer_id)
);
CREATE TABLE stall_payment (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  pickup_id uuid NOT NULL REFERENCES pickup,
  kind text NOT NULL CHECK (kind IN ('cash', 'card_reader', 'token', 'benefit_card')),
  amount_minor integer NOT NULL CHECK (amount_minor > 0),
  tendered_minor integer, change_minor integer NOT NULL DEFAULT 0 CHECK (change_minor >= 0),
  by_person uuid NOT NULL REFERENCES person,
  at timestamptz(3) NOT NULL,
  undone_at timestamptz(3), undone_by uuid REFERENCES person,
  CHECK ((undone_at IS NULL) = (undone_by IS NULL)),
  CHECK (kind = 'cash' OR change_minor = 0),
  CHECK (tendered_minor IS NULL OR tendered_minor >= change_minor)
);
CREATE INDEX stall_payment_pickup ON stall_payment (pickup_id);

CREATE TABLE post (
  id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
  slug slug NOT NULL UNIQUE,
  title text NOT NULL CHECK (title <> ''),
  topic text NOT NULL CHECK (topic IN ('fresh', 'growing')),
  markdown text NOT NULL,
  author_id uuid NOT NULL REFERENCES person,
  posted_at timestamptz(3),
  changed_at timestamptz(3) NOT NULL,
  version integer NOT NULL DEFAULT 1
);
CREATE INDEX post_posted ON post (posted_at DESC);
CREATE TABLE post_variety (
  post_id uuid NOT NULL REFERENCES post ON DELETE CASCADE,
  variety_id uuid NOT NULL REFERENCES variety,
  PRIMARY KEY (post_id, variety_id)
);
CREATE TABLE post_photo (
  post_id uuid NOT NULL REFERENCES post ON DELETE CASCADE,
  position smallint NOT NULL,
  file_id uuid NOT NULL REFERENCES file,
  alt text NOT NULL CHECK (alt <> ''),
  PRIMARY KEY (post_id, position)
);
`;
