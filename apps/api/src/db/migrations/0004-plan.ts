import type { Migration } from './migration.ts';

/** Supply, work, and the plan that gives work its time. */
export const plan: Migration = {
  name: '0004-plan',
  sql: `
CREATE TABLE people (
  id TEXT NOT NULL PRIMARY KEY,
  name TEXT NOT NULL,
  user_id TEXT UNIQUE REFERENCES users (id),
  active INTEGER NOT NULL DEFAULT 1 CHECK (active IN (0, 1))
) STRICT;

CREATE TABLE skills (
  id TEXT NOT NULL PRIMARY KEY,
  name TEXT NOT NULL
) STRICT;

CREATE TABLE person_skills (
  person_id TEXT NOT NULL REFERENCES people (id),
  skill_id TEXT NOT NULL REFERENCES skills (id),
  PRIMARY KEY (person_id, skill_id)
) STRICT, WITHOUT ROWID;
CREATE INDEX person_skills_skill_id ON person_skills (skill_id);

CREATE TABLE weekly_shifts (
  id TEXT NOT NULL PRIMARY KEY,
  weekday INTEGER NOT NULL CHECK (weekday BETWEEN 1 AND 7),
  start_minute INTEGER NOT NULL CHECK (start_minute BETWEEN 0 AND 1440),
  end_minute INTEGER NOT NULL CHECK (end_minute BETWEEN 0 AND 1440),
  valid_from TEXT CHECK (valid_from = date(valid_from)),
  valid_until TEXT CHECK (valid_until = date(valid_until)),
  CHECK (end_minute > start_minute)
) STRICT;
CREATE INDEX weekly_shifts_weekday ON weekly_shifts (weekday);

CREATE TABLE weekly_shift_people (
  weekly_shift_id TEXT NOT NULL REFERENCES weekly_shifts (id) ON DELETE CASCADE,
  person_id TEXT NOT NULL REFERENCES people (id),
  PRIMARY KEY (weekly_shift_id, person_id)
) STRICT, WITHOUT ROWID;
CREATE INDEX weekly_shift_people_person_id ON weekly_shift_people (person_id);

CREATE TABLE shifts (
  id TEXT NOT NULL PRIMARY KEY,
  local_date TEXT NOT NULL CHECK (local_date = date(local_date)),
  start_minute INTEGER NOT NULL CHECK (start_minute BETWEEN 0 AND 1440),
  end_minute INTEGER NOT NULL CHECK (end_minute BETWEEN 0 AND 1440),
  start_at TEXT NOT NULL CHECK (start_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  end_at TEXT NOT NULL CHECK (end_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  weekly_shift_id TEXT REFERENCES weekly_shifts (id),
  bench_minutes INTEGER NOT NULL CHECK (bench_minutes >= 0),
  mixer_minutes INTEGER NOT NULL CHECK (mixer_minutes >= 0),
  oven_minutes INTEGER NOT NULL CHECK (oven_minutes >= 0),
  off INTEGER NOT NULL DEFAULT 0 CHECK (off IN (0, 1)),
  note TEXT NOT NULL DEFAULT '',
  UNIQUE (local_date, start_minute),
  CHECK (end_minute > start_minute)
) STRICT;
CREATE INDEX shifts_start_at ON shifts (start_at);
CREATE INDEX shifts_weekly_shift_id ON shifts (weekly_shift_id) WHERE weekly_shift_id IS NOT NULL;

CREATE TABLE shift_people (
  shift_id TEXT NOT NULL REFERENCES shifts (id) ON DELETE CASCADE,
  person_id TEXT NOT NULL REFERENCES people (id),
  PRIMARY KEY (shift_id, person_id)
) STRICT, WITHOUT ROWID;
CREATE INDEX shift_people_person_id ON shift_people (person_id);

CREATE TABLE closures (
  id TEXT NOT NULL PRIMARY KEY,
  from_date TEXT NOT NULL CHECK (from_date = date(from_date)),
  to_date TEXT NOT NULL CHECK (to_date = date(to_date)),
  kind TEXT NOT NULL CHECK (kind IN ('holiday', 'blocked', 'outage')),
  reason TEXT NOT NULL,
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_by_user_id TEXT REFERENCES users (id),
  reopened_at TEXT CHECK (reopened_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  CHECK (to_date >= from_date)
) STRICT;
CREATE INDEX closures_from_date_to_date ON closures (from_date, to_date);
CREATE INDEX closures_created_by_user_id ON closures (created_by_user_id) WHERE created_by_user_id IS NOT NULL;

CREATE TABLE equipment (
  id TEXT NOT NULL PRIMARY KEY,
  kind TEXT NOT NULL CHECK (kind IN ('mixer', 'oven-deck')),
  name TEXT NOT NULL,
  capacity_mg INTEGER CHECK (capacity_mg >= 1),
  width_mm INTEGER CHECK (width_mm >= 1),
  depth_mm INTEGER CHECK (depth_mm >= 1),
  height_mm INTEGER CHECK (height_mm >= 1),
  active INTEGER NOT NULL DEFAULT 1 CHECK (active IN (0, 1)),
  CHECK (kind <> 'mixer' OR capacity_mg IS NOT NULL),
  CHECK (kind <> 'oven-deck' OR (width_mm IS NOT NULL AND depth_mm IS NOT NULL))
) STRICT;

CREATE TABLE cold_places (
  id TEXT NOT NULL PRIMARY KEY,
  name TEXT NOT NULL,
  width_mm INTEGER NOT NULL CHECK (width_mm >= 1),
  depth_mm INTEGER NOT NULL CHECK (depth_mm >= 1),
  height_mm INTEGER NOT NULL CHECK (height_mm >= 1),
  places INTEGER NOT NULL CHECK (places >= 0),
  active INTEGER NOT NULL DEFAULT 1 CHECK (active IN (0, 1))
) STRICT;

CREATE TABLE weekly_pickup_windows (
  id TEXT NOT NULL PRIMARY KEY,
  weekday INTEGER NOT NULL CHECK (weekday BETWEEN 1 AND 7),
  start_minute INTEGER NOT NULL CHECK (start_minute BETWEEN 0 AND 1440),
  minutes INTEGER NOT NULL CHECK (minutes >= 1),
  handovers INTEGER NOT NULL CHECK (handovers >= 0),
  active INTEGER NOT NULL DEFAULT 1 CHECK (active IN (0, 1)),
  UNIQUE (weekday, start_minute)
) STRICT;

CREATE TABLE pickup_windows (
  id TEXT NOT NULL PRIMARY KEY,
  local_date TEXT NOT NULL CHECK (local_date = date(local_date)),
  start_minute INTEGER NOT NULL CHECK (start_minute BETWEEN 0 AND 1440),
  minutes INTEGER NOT NULL CHECK (minutes >= 1),
  handovers INTEGER NOT NULL CHECK (handovers >= 0),
  UNIQUE (local_date, start_minute)
) STRICT;

CREATE TABLE day_caps (
  id TEXT NOT NULL PRIMARY KEY,
  occasion_id TEXT REFERENCES occasions (id),
  weekday INTEGER CHECK (weekday BETWEEN 1 AND 7),
  local_date TEXT CHECK (local_date = date(local_date)),
  max_orders INTEGER NOT NULL CHECK (max_orders >= 0)
) STRICT;
CREATE INDEX day_caps_occasion_id ON day_caps (occasion_id) WHERE occasion_id IS NOT NULL;

CREATE TABLE notice_rules (
  item_kind TEXT NOT NULL PRIMARY KEY CHECK (item_kind IN ('tiered', 'sheet', 'pieces', 'cutting', 'tasting-box', 'stand', 'extra')),
  days INTEGER NOT NULL CHECK (days >= 0)
) STRICT;

CREATE TABLE tasks (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  revision_id TEXT NOT NULL REFERENCES order_revisions (id),
  kind TEXT NOT NULL CHECK (kind IN ('bake', 'custard', 'buttercream', 'filling', 'fill-and-crumb-coat', 'final-coat', 'cover', 'decorate', 'stack', 'box', 'handover', 'drive', 'set-up')),
  label TEXT NOT NULL,
  item_id TEXT REFERENCES order_items (id),
  tier_position INTEGER CHECK (tier_position >= 0),
  bench_minutes INTEGER NOT NULL DEFAULT 0 CHECK (bench_minutes >= 0),
  mixer_minutes INTEGER NOT NULL DEFAULT 0 CHECK (mixer_minutes >= 0),
  oven_minutes INTEGER NOT NULL DEFAULT 0 CHECK (oven_minutes >= 0),
  skill_id TEXT REFERENCES skills (id),
  within_minutes INTEGER CHECK (within_minutes >= 0),
  state TEXT NOT NULL DEFAULT 'planned' CHECK (state IN ('planned', 'started', 'finished', 'late', 'dropped')),
  minutes_taken INTEGER CHECK (minutes_taken >= 0),
  started_at TEXT CHECK (started_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  finished_at TEXT CHECK (finished_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  finished_by_user_id TEXT REFERENCES users (id),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX tasks_order_id_state ON tasks (order_id, state);
CREATE INDEX tasks_revision_id ON tasks (revision_id);
CREATE INDEX tasks_item_id ON tasks (item_id) WHERE item_id IS NOT NULL;
CREATE INDEX tasks_skill_id ON tasks (skill_id) WHERE skill_id IS NOT NULL;
CREATE INDEX tasks_finished_by_user_id ON tasks (finished_by_user_id) WHERE finished_by_user_id IS NOT NULL;

CREATE TABLE batches (
  id TEXT NOT NULL PRIMARY KEY,
  formula_version_id TEXT NOT NULL REFERENCES formula_versions (id),
  shift_id TEXT REFERENCES shifts (id),
  bowls INTEGER NOT NULL DEFAULT 1 CHECK (bowls >= 1),
  weight_mg INTEGER NOT NULL CHECK (weight_mg >= 0),
  bench_minutes INTEGER NOT NULL DEFAULT 0 CHECK (bench_minutes >= 0),
  mixer_minutes INTEGER NOT NULL DEFAULT 0 CHECK (mixer_minutes >= 0),
  oven_minutes INTEGER NOT NULL DEFAULT 0 CHECK (oven_minutes >= 0),
  state TEXT NOT NULL DEFAULT 'planned' CHECK (state IN ('planned', 'started', 'finished', 'late', 'dropped')),
  lot TEXT,
  minutes_taken INTEGER CHECK (minutes_taken >= 0),
  started_at TEXT CHECK (started_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  finished_at TEXT CHECK (finished_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  finished_by_user_id TEXT REFERENCES users (id),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX batches_formula_version_id ON batches (formula_version_id);
CREATE INDEX batches_shift_id ON batches (shift_id) WHERE shift_id IS NOT NULL;
CREATE INDEX batches_finished_by_user_id ON batches (finished_by_user_id) WHERE finished_by_user_id IS NOT NULL;

CREATE TABLE batch_shares (
  batch_id TEXT NOT NULL REFERENCES batches (id) ON DELETE CASCADE,
  order_id TEXT NOT NULL REFERENCES orders (id),
  weight_mg INTEGER NOT NULL CHECK (weight_mg >= 1),
  PRIMARY KEY (batch_id, order_id)
) STRICT, WITHOUT ROWID;
CREATE INDEX batch_shares_order_id ON batch_shares (order_id);

CREATE TABLE task_links (
  id TEXT NOT NULL PRIMARY KEY,
  before_task_id TEXT REFERENCES tasks (id) ON DELETE CASCADE,
  before_batch_id TEXT REFERENCES batches (id) ON DELETE CASCADE,
  after_task_id TEXT REFERENCES tasks (id) ON DELETE CASCADE,
  after_batch_id TEXT REFERENCES batches (id) ON DELETE CASCADE,
  gap_minutes INTEGER NOT NULL DEFAULT 0 CHECK (gap_minutes >= 0),
  keeps_minutes INTEGER CHECK (keeps_minutes >= gap_minutes),
  CHECK ((before_task_id IS NULL) <> (before_batch_id IS NULL)),
  CHECK ((after_task_id IS NULL) <> (after_batch_id IS NULL))
) STRICT;
CREATE INDEX task_links_before_task_id ON task_links (before_task_id) WHERE before_task_id IS NOT NULL;
CREATE INDEX task_links_before_batch_id ON task_links (before_batch_id) WHERE before_batch_id IS NOT NULL;
CREATE INDEX task_links_after_task_id ON task_links (after_task_id) WHERE after_task_id IS NOT NULL;
CREATE INDEX task_links_after_batch_id ON task_links (after_batch_id) WHERE after_batch_id IS NOT NULL;

CREATE TABLE assignments (
  id TEXT NOT NULL PRIMARY KEY,
  task_id TEXT UNIQUE REFERENCES tasks (id) ON DELETE CASCADE,
  batch_id TEXT UNIQUE REFERENCES batches (id) ON DELETE CASCADE,
  shift_id TEXT NOT NULL REFERENCES shifts (id),
  start_at TEXT NOT NULL CHECK (start_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  minutes INTEGER NOT NULL CHECK (minutes >= 0),
  pinned INTEGER NOT NULL DEFAULT 0 CHECK (pinned IN (0, 1)),
  plan_version INTEGER NOT NULL CHECK (plan_version >= 0),
  CHECK ((task_id IS NULL) <> (batch_id IS NULL))
) STRICT;
CREATE INDEX assignments_start_at ON assignments (start_at);
CREATE INDEX assignments_shift_id ON assignments (shift_id);

CREATE TABLE holds (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  kind TEXT NOT NULL CHECK (kind IN ('guest-link', 'answer', 'quote', 'deposit')),
  expires_at TEXT NOT NULL CHECK (expires_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  released_at TEXT CHECK (released_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  released_reason TEXT CHECK (released_reason IN ('confirmed', 'ended', 'ran-out', 'replaced')),
  CHECK ((released_at IS NULL) = (released_reason IS NULL))
) STRICT;
CREATE UNIQUE INDEX holds_order_id_once ON holds (order_id) WHERE released_at IS NULL;
CREATE INDEX holds_expires_at ON holds (expires_at) WHERE released_at IS NULL;
CREATE INDEX holds_order_id ON holds (order_id);
`,
};
