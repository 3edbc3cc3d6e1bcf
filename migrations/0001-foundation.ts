import type { QueryInterface } from 'sequelize'

/**
 * People, panels, rounds, servings, ratings, the key and what is published.
 * Every table but `users`, `sessions`, `user_tokens` and `demo_messages` carries `panel_id`, and foreign keys are
 * composite, so that a row of one panel cannot point into another.
 * Names for values are checked here as well as in the contracts: the database is the last to be asked.
 */
const up = `
create table users (
  id uuid primary key,
  email text not null unique check (email = lower(email)),
  name text not null,
  password_hash text not null,
  version integer not null default 1,
  created_at timestamptz not null
);
create table sessions (sid text primary key, sess json not null, expire timestamptz not null);
create index sessions_expire on sessions (expire);
create table user_tokens (
  id uuid primary key,
  user_id uuid not null references users (id) on delete cascade,
  kind text not null check (kind in ('reset')),
  token_hash text not null unique,
  expires_at timestamptz not null,
  used_at timestamptz
);
create table demo_messages (
  id uuid primary key,
  recipient text not null,
  subject text not null,
  body text not null,
  received_at timestamptz not null
);

create table panels (
  id uuid primary key,
  slug text not null unique,
  name text not null,
  time_zone text not null,
  version integer not null default 1,
  created_at timestamptz not null
);
create table members (
  panel_id uuid not null references panels (id),
  id uuid primary key,
  user_id uuid references users (id),
  display_name text not null,
  email text,
  roles text[] not null default '{}',
  created_at timestamptz not null,
  removed_at timestamptz,
  unique (panel_id, id),
  unique (panel_id, user_id)
);
create index members_user on members (user_id);

create table photos (
  panel_id uuid not null references panels (id),
  id uuid primary key,
  media_type text not null,
  width integer not null,
  height integer not null,
  bytes bytea not null,
  created_at timestamptz not null,
  unique (panel_id, id)
);
create table units (
  panel_id uuid not null references panels (id),
  id uuid primary key,
  maker text not null,
  name text not null,
  serial text not null default '',
  firmware text not null default '',
  provenance text check (provenance in ('bought', 'loan', 'gift', 'discounted', 'prototype')),
  lender text,
  return_on date,
  disclosure text,
  price_minor bigint check (price_minor >= 0),
  price_currency text check (price_currency ~ '^[A-Z]{3}$'),
  price_on date,
  price_unknown boolean not null default false,
  photo_id uuid,
  version integer not null default 1,
  created_at timestamptz not null,
  unique (panel_id, id),
  foreign key (panel_id, photo_id) references photos (panel_id, id),
  check ((price_minor is null) = (price_currency is null) and (price_minor is null) = (price_on is null))
);

create table scorecards (
  panel_id uuid not null references panels (id),
  id uuid primary key,
  name text not null,
  version integer not null default 1,
  created_at timestamptz not null,
  unique (panel_id, id)
);
create table descriptors (
  panel_id uuid not null references panels (id),
  id uuid primary key,
  scorecard_id uuid not null,
  place integer not null,
  key text not null,
  name text not null,
  sentence text not null,
  family text not null check (family in ('liking', 'tonal-balance', 'staging', 'timbre')),
  scale_low double precision not null,
  scale_high double precision not null,
  step double precision not null check (step > 0),
  sided text not null check (sided in ('one', 'two')),
  low_words text not null,
  middle_words text,
  high_words text not null,
  unique (panel_id, id),
  unique (scorecard_id, key),
  foreign key (panel_id, scorecard_id) references scorecards (panel_id, id),
  check (scale_low < scale_high)
);

create table rounds (
  panel_id uuid not null references panels (id),
  id uuid primary key,
  number integer not null,
  title text not null,
  question text not null,
  status text not null check (status in ('draft', 'open', 'closed', 'published', 'cancelled')),
  origin text not null check (origin in ('live', 'imported')),
  blinding text not null check (blinding in ('double', 'single', 'split', 'imported')),
  mode text not null check (mode in ('evening', 'full')),
  scorecard_id uuid not null,
  primary_descriptor text not null,
  plan jsonb not null,
  publishes_rows boolean not null default true,
  plan_file text,
  plan_fingerprint text,
  key_fingerprint text,
  ratings_file text,
  ratings_fingerprint text,
  created_at timestamptz not null,
  opened_at timestamptz,
  closed_at timestamptz,
  published_at timestamptz,
  cancelled_at timestamptz,
  cancel_reason text,
  changed_at timestamptz not null,
  version integer not null default 1,
  unique (panel_id, id),
  unique (panel_id, number),
  foreign key (panel_id, scorecard_id) references scorecards (panel_id, id),
  check (origin = 'imported' or status in ('draft', 'cancelled') or (plan_fingerprint is not null and key_fingerprint is not null))
);
create table round_units (
  panel_id uuid not null,
  round_id uuid not null,
  unit_id uuid not null,
  primary key (round_id, unit_id),
  foreign key (panel_id, round_id) references rounds (panel_id, id),
  foreign key (panel_id, unit_id) references units (panel_id, id)
);
create table round_roles (
  panel_id uuid not null,
  id uuid primary key,
  round_id uuid not null,
  member_id uuid not null,
  role text not null check (role in ('organiser', 'keeper', 'letters', 'codes', 'steward', 'panelist')),
  link_hash text unique,
  link_version integer not null default 1,
  opened_at timestamptz,
  unique (panel_id, id),
  unique (round_id, member_id, role),
  foreign key (panel_id, round_id) references rounds (panel_id, id),
  foreign key (panel_id, member_id) references members (panel_id, id)
);

create table sittings (
  panel_id uuid not null,
  id uuid primary key,
  round_id uuid not null,
  name text not null,
  turn integer not null default 0,
  turns integer not null,
  started_at timestamptz,
  ended_at timestamptz,
  version integer not null default 1,
  unique (panel_id, id),
  foreign key (panel_id, round_id) references rounds (panel_id, id)
);
create table rows (
  panel_id uuid not null,
  id uuid primary key,
  round_id uuid not null,
  spare boolean not null,
  unique (panel_id, id),
  foreign key (panel_id, round_id) references rounds (panel_id, id)
);
create table row_places (
  panel_id uuid not null,
  id uuid primary key,
  row_id uuid not null,
  code_set text not null check (code_set in ('served', 'takeover', 'reserve')),
  turn integer not null,
  position integer not null,
  code text not null check (code ~ '^[1-9][0-9]{2}$'),
  unique (panel_id, id),
  unique (row_id, code_set, position),
  foreign key (panel_id, row_id) references rows (panel_id, id)
);

create table key_entries (
  panel_id uuid not null,
  row_place_id uuid primary key,
  unit_id uuid not null,
  foreign key (panel_id, row_place_id) references row_places (panel_id, id),
  foreign key (panel_id, unit_id) references units (panel_id, id)
);
create table key_letters (
  panel_id uuid not null,
  round_id uuid not null,
  letter text not null check (letter ~ '^[A-L]$'),
  unit_id uuid not null,
  served text not null,
  reserve text not null,
  primary key (round_id, letter),
  foreign key (panel_id, round_id) references rounds (panel_id, id),
  foreign key (panel_id, unit_id) references units (panel_id, id)
);
create table key_listeners (
  panel_id uuid not null,
  round_id uuid not null,
  row_id uuid not null,
  code_set text not null check (code_set in ('served', 'takeover')),
  number integer not null,
  primary key (row_id, code_set),
  unique (round_id, number),
  foreign key (panel_id, row_id) references rows (panel_id, id)
);
create table round_secrets (
  panel_id uuid not null,
  round_id uuid primary key,
  seed_cipher bytea not null,
  nonce_cipher bytea not null,
  key_cipher bytea not null,
  foreign key (panel_id, round_id) references rounds (panel_id, id)
);

create table seats (
  panel_id uuid not null,
  id uuid primary key,
  round_id uuid not null,
  sitting_id uuid not null,
  member_id uuid,
  row_id uuid not null,
  code_set text not null check (code_set in ('served', 'takeover')),
  number integer not null,
  label text not null,
  link_hash text unique,
  link_version integer not null default 1,
  opened_at timestamptz,
  consent_version text,
  consented_at timestamptz,
  left_at timestamptz,
  unique (panel_id, id),
  unique (sitting_id, number),
  unique (row_id, code_set),
  foreign key (panel_id, sitting_id) references sittings (panel_id, id),
  foreign key (panel_id, member_id) references members (panel_id, id),
  foreign key (panel_id, row_id) references rows (panel_id, id)
);
create table servings (
  panel_id uuid not null,
  id uuid primary key,
  seat_id uuid not null,
  row_place_id uuid not null unique,
  turn integer not null,
  position integer not null,
  state text not null check (state in ('waiting', 'tagged', 'handed', 'confirmed', 'submitted', 'void', 'missed')),
  wrong_codes integer not null default 0,
  sealed text check (sealed in ('yes', 'unsure', 'no')),
  handed_at timestamptz,
  confirmed_at timestamptz,
  submitted_at timestamptz,
  rest_until timestamptz,
  voided_at timestamptz,
  void_reason text,
  repeats_serving_id uuid,
  version integer not null default 1,
  unique (panel_id, id),
  foreign key (panel_id, seat_id) references seats (panel_id, id),
  foreign key (panel_id, row_place_id) references row_places (panel_id, id),
  foreign key (panel_id, repeats_serving_id) references servings (panel_id, id)
);
create index servings_seat on servings (seat_id);
create table submissions (
  panel_id uuid not null,
  id uuid primary key,
  serving_id uuid not null,
  revision integer not null,
  idempotency_key text not null,
  received_at timestamptz not null,
  outcome text not null check (outcome in ('taken', 'late', 'void')),
  reason text,
  remark text not null default '',
  unique (panel_id, id),
  unique (serving_id, revision),
  unique (serving_id, idempotency_key),
  foreign key (panel_id, serving_id) references servings (panel_id, id)
);
create table ratings (
  panel_id uuid not null,
  submission_id uuid not null,
  descriptor_id uuid not null,
  value double precision,
  cant_tell boolean not null,
  primary key (submission_id, descriptor_id),
  foreign key (panel_id, submission_id) references submissions (panel_id, id),
  foreign key (panel_id, descriptor_id) references descriptors (panel_id, id),
  check ((value is null) = cant_tell)
);
create table end_answers (
  panel_id uuid not null,
  seat_id uuid primary key,
  recognised text not null check (recognised in ('none', 'perhaps', 'yes')),
  recognitions jsonb not null,
  received_at timestamptz not null,
  foreign key (panel_id, seat_id) references seats (panel_id, id)
);
create table imported_ratings (
  panel_id uuid not null,
  id uuid primary key,
  round_id uuid not null,
  member_id uuid not null,
  listener integer not null,
  unit_id uuid not null,
  descriptor_id uuid not null,
  replicate text not null,
  position integer,
  value double precision,
  cant_tell boolean not null default false,
  unique (round_id, member_id, unit_id, descriptor_id, replicate),
  foreign key (panel_id, round_id) references rounds (panel_id, id),
  foreign key (panel_id, member_id) references members (panel_id, id),
  foreign key (panel_id, unit_id) references units (panel_id, id),
  foreign key (panel_id, descriptor_id) references descriptors (panel_id, id)
);
create table incidents (
  panel_id uuid not null,
  id uuid primary key,
  round_id uuid not null,
  sitting_id uuid not null,
  seat_id uuid,
  serving_id uuid,
  kind text not null check (kind in ('mix-up', 'lost-seal', 'unit-fault', 'key-learned', 'wrong-code', 'void', 'other')),
  text text not null,
  created_at timestamptz not null,
  foreign key (panel_id, round_id) references rounds (panel_id, id),
  foreign key (panel_id, sitting_id) references sittings (panel_id, id),
  foreign key (panel_id, seat_id) references seats (panel_id, id)
);
create table tag_marks (
  panel_id uuid not null,
  round_id uuid not null,
  part text not null check (part in ('letters', 'codes')),
  letter text not null,
  marked_at timestamptz not null,
  primary key (round_id, part, letter),
  foreign key (panel_id, round_id) references rounds (panel_id, id)
);
create table audit_events (
  panel_id uuid not null references panels (id),
  id uuid primary key,
  round_id uuid,
  actor text not null,
  action text not null,
  facts jsonb not null default '{}',
  at timestamptz not null,
  foreign key (panel_id, round_id) references rounds (panel_id, id)
);
create table idempotent_answers (
  panel_id uuid not null references panels (id),
  scope text not null,
  key text not null,
  request_digest text not null,
  body jsonb not null,
  created_at timestamptz not null,
  primary key (scope, key)
);
create table analyses (
  panel_id uuid not null,
  id uuid primary key,
  round_id uuid not null,
  digest text not null,
  library_version text not null,
  seed text not null,
  result jsonb not null,
  created_at timestamptz not null,
  unique (round_id, digest, library_version),
  foreign key (panel_id, round_id) references rounds (panel_id, id)
);
create table verdicts (
  panel_id uuid not null,
  id uuid primary key,
  round_id uuid not null,
  slug text not null,
  number integer not null,
  version integer not null,
  content jsonb not null,
  correction text not null default '',
  published_at timestamptz not null,
  unique (round_id, version),
  unique (slug, version),
  foreign key (panel_id, round_id) references rounds (panel_id, id)
);
create sequence verdict_numbers;
create table verdict_drafts (
  panel_id uuid not null,
  round_id uuid primary key,
  headline text not null default '',
  summary text not null default '',
  version integer not null default 1,
  foreign key (panel_id, round_id) references rounds (panel_id, id)
);

grant select, insert, update, delete on
  users, sessions, user_tokens, demo_messages, panels, members, photos, units, scorecards, descriptors, rounds,
  round_units, round_roles, sittings, rows, row_places, seats, servings, end_answers, tag_marks,
  idempotent_answers, verdict_drafts
  to scrim_app;
-- What happened is added to and never changed.
grant select, insert on submissions, ratings, imported_ratings, incidents, audit_events, analyses, verdicts to scrim_app;
grant usage on sequence verdict_numbers to scrim_app;
-- The key answers only to the role that server/features/key takes on inside its own statements.
grant select, insert on key_entries, key_letters, key_listeners, round_secrets to scrim_key;
grant select on row_places, rows, units, rounds to scrim_key;
`

const down = `
drop table verdict_drafts, verdicts, analyses, idempotent_answers, audit_events, tag_marks, incidents, imported_ratings,
  end_answers, ratings, submissions, servings, seats, round_secrets, key_listeners, key_letters, key_entries, row_places,
  rows, sittings, round_roles, round_units, rounds, descriptors, scorecards, units, photos, members, panels,
  demo_messages, user_tokens, sessions, users;
drop sequence verdict_numbers;
`

export const foundation = {
  name: '0001-foundation',
  up: async ({ context }: { context: QueryInterface }): Promise<void> => {
    await context.sequelize.query(up)
  },
  down: async ({ context }: { context: QueryInterface }): Promise<void> => {
    await context.sequelize.query(down)
  },
}
