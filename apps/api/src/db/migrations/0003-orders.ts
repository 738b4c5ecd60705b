import type { Migration } from './migration.ts';

/** Orders, what was asked for in each revision, quotes, and what was said. */
export const orders: Migration = {
  name: '0003-orders',
  sql: `
CREATE TABLE orders (
  id TEXT NOT NULL PRIMARY KEY,
  number INTEGER NOT NULL UNIQUE CHECK (number >= 1),
  code TEXT NOT NULL UNIQUE,
  status TEXT NOT NULL CHECK (status IN ('asked', 'quoted', 'agreed', 'confirmed', 'making', 'ready', 'collected', 'declined', 'withdrawn', 'lapsed', 'cancelled', 'uncollected')),
  row_version INTEGER NOT NULL DEFAULT 1 CHECK (row_version >= 1),
  current_revision_id TEXT REFERENCES order_revisions (id),
  agreed_revision_id TEXT REFERENCES order_revisions (id),
  customer_user_id TEXT REFERENCES users (id),
  occasion_id TEXT NOT NULL REFERENCES occasions (id),
  currency TEXT NOT NULL CHECK (length(currency) = 3),
  terms TEXT NOT NULL CHECK (json_valid(terms)),
  pickup_date TEXT CHECK (pickup_date = date(pickup_date)),
  window_start_minute INTEGER CHECK (window_start_minute BETWEEN 0 AND 1440),
  window_minutes INTEGER CHECK (window_minutes >= 1),
  zone TEXT NOT NULL,
  pickup_at TEXT CHECK (pickup_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  date_answer TEXT NOT NULL CHECK (date_answer IN ('open', 'last-place', 'ask-us')),
  private_key_hash TEXT UNIQUE,
  key_renewed_at TEXT CHECK (key_renewed_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  link_opened_at TEXT CHECK (link_opened_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  show_photos INTEGER NOT NULL DEFAULT 0 CHECK (show_photos IN (0, 1)),
  sent_from_hash TEXT,
  confirmed_at TEXT CHECK (confirmed_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  ended_at TEXT CHECK (ended_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  ended_by TEXT CHECK (ended_by IN ('customer', 'studio', 'time')),
  ended_reason TEXT,
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  updated_at TEXT NOT NULL CHECK (updated_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  CHECK ((pickup_date IS NULL) = (pickup_at IS NULL) AND (pickup_date IS NULL) = (window_start_minute IS NULL) AND (pickup_date IS NULL) = (window_minutes IS NULL))
) STRICT;
CREATE INDEX orders_pickup_date_window_start_minute ON orders (pickup_date, window_start_minute);
CREATE INDEX orders_status_pickup_date ON orders (status, pickup_date);
CREATE INDEX orders_created_at ON orders (created_at);
CREATE INDEX orders_current_revision_id ON orders (current_revision_id) WHERE current_revision_id IS NOT NULL;
CREATE INDEX orders_agreed_revision_id ON orders (agreed_revision_id) WHERE agreed_revision_id IS NOT NULL;
CREATE INDEX orders_customer_user_id ON orders (customer_user_id) WHERE customer_user_id IS NOT NULL;
CREATE INDEX orders_occasion_id ON orders (occasion_id);
CREATE INDEX orders_sent_from_hash ON orders (sent_from_hash) WHERE sent_from_hash IS NOT NULL;

CREATE TABLE order_revisions (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  n INTEGER NOT NULL CHECK (n >= 1),
  head_count INTEGER NOT NULL CHECK (head_count >= 1),
  occasion_id TEXT NOT NULL REFERENCES occasions (id),
  other_desserts INTEGER NOT NULL DEFAULT 0 CHECK (other_desserts IN (0, 1)),
  portion_size_id TEXT NOT NULL REFERENCES portion_sizes (id),
  infants INTEGER NOT NULL DEFAULT 0 CHECK (infants IN (0, 1)),
  susceptible_guests INTEGER NOT NULL DEFAULT 0 CHECK (susceptible_guests IN (0, 1)),
  diet_note TEXT NOT NULL DEFAULT '',
  pickup_date TEXT CHECK (pickup_date = date(pickup_date)),
  window_start_minute INTEGER CHECK (window_start_minute BETWEEN 0 AND 1440),
  window_minutes INTEGER CHECK (window_minutes >= 1),
  setting_place TEXT NOT NULL CHECK (setting_place IN ('indoors', 'shade', 'sun')),
  setting_warmest_c REAL,
  setting_minutes_out INTEGER NOT NULL CHECK (setting_minutes_out >= 0),
  setting_drive_minutes INTEGER NOT NULL CHECK (setting_drive_minutes >= 0),
  fulfilment TEXT NOT NULL DEFAULT 'collect' CHECK (fulfilment IN ('collect', 'deliver', 'deliver-and-set-up')),
  address_street TEXT,
  address_town TEXT,
  address_postcode TEXT,
  address_access TEXT,
  day_contact_name TEXT,
  day_contact_phone TEXT,
  arrival_start_minute INTEGER CHECK (arrival_start_minute BETWEEN 0 AND 1440),
  arrival_minutes INTEGER CHECK (arrival_minutes >= 1),
  travel_minutes INTEGER CHECK (travel_minutes >= 0),
  note TEXT NOT NULL DEFAULT '',
  change_note TEXT,
  estimate TEXT NOT NULL CHECK (json_valid(estimate)),
  price_book_version_id TEXT NOT NULL REFERENCES price_book_versions (id),
  work_time_version_id TEXT NOT NULL REFERENCES work_time_versions (id),
  total_minor INTEGER NOT NULL,
  currency TEXT NOT NULL CHECK (length(currency) = 3),
  created_by_role TEXT NOT NULL CHECK (created_by_role IN ('guest', 'customer', 'counter', 'baker', 'owner')),
  created_by_user_id TEXT REFERENCES users (id),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  UNIQUE (order_id, n),
  CHECK (fulfilment = 'collect' OR travel_minutes IS NOT NULL)
) STRICT;
CREATE INDEX order_revisions_occasion_id ON order_revisions (occasion_id);
CREATE INDEX order_revisions_portion_size_id ON order_revisions (portion_size_id);
CREATE INDEX order_revisions_price_book_version_id ON order_revisions (price_book_version_id);
CREATE INDEX order_revisions_work_time_version_id ON order_revisions (work_time_version_id);
CREATE INDEX order_revisions_created_by_user_id ON order_revisions (created_by_user_id) WHERE created_by_user_id IS NOT NULL;

CREATE TABLE revision_policy_versions (
  revision_id TEXT NOT NULL REFERENCES order_revisions (id),
  policy_version_id TEXT NOT NULL REFERENCES policy_versions (id),
  PRIMARY KEY (revision_id, policy_version_id)
) STRICT, WITHOUT ROWID;
CREATE INDEX revision_policy_versions_policy_version_id ON revision_policy_versions (policy_version_id);

CREATE TABLE revision_formula_versions (
  revision_id TEXT NOT NULL REFERENCES order_revisions (id),
  formula_version_id TEXT NOT NULL REFERENCES formula_versions (id),
  PRIMARY KEY (revision_id, formula_version_id)
) STRICT, WITHOUT ROWID;
CREATE INDEX revision_formula_versions_formula_version_id ON revision_formula_versions (formula_version_id);

CREATE TABLE order_items (
  id TEXT NOT NULL PRIMARY KEY,
  revision_id TEXT NOT NULL REFERENCES order_revisions (id),
  position INTEGER NOT NULL CHECK (position >= 0),
  kind TEXT NOT NULL CHECK (kind IN ('tiered', 'sheet', 'pieces', 'cutting', 'tasting-box', 'stand', 'extra')),
  quantity INTEGER NOT NULL DEFAULT 1 CHECK (quantity >= 1),
  sheet_size_id TEXT REFERENCES sheet_sizes (id),
  extra_id TEXT REFERENCES extras (id),
  label TEXT,
  stand_deposit_minor INTEGER CHECK (stand_deposit_minor >= 0),
  note TEXT NOT NULL DEFAULT '',
  UNIQUE (revision_id, position),
  CHECK ((kind = 'sheet') = (sheet_size_id IS NOT NULL)),
  CHECK ((kind = 'extra') = (extra_id IS NOT NULL))
) STRICT;
CREATE INDEX order_items_sheet_size_id ON order_items (sheet_size_id) WHERE sheet_size_id IS NOT NULL;
CREATE INDEX order_items_extra_id ON order_items (extra_id) WHERE extra_id IS NOT NULL;

CREATE TABLE item_tiers (
  id TEXT NOT NULL PRIMARY KEY,
  item_id TEXT NOT NULL REFERENCES order_items (id),
  position INTEGER NOT NULL CHECK (position >= 0),
  shape TEXT NOT NULL CHECK (shape IN ('round', 'square', 'rectangle')),
  width_mm INTEGER NOT NULL CHECK (width_mm >= 1),
  depth_mm INTEGER NOT NULL CHECK (depth_mm >= 1),
  height_mm INTEGER NOT NULL CHECK (height_mm >= 1),
  layers INTEGER NOT NULL CHECK (layers >= 1),
  real INTEGER NOT NULL DEFAULT 1 CHECK (real IN (0, 1)),
  keepsake INTEGER NOT NULL DEFAULT 0 CHECK (keepsake IN (0, 1)),
  sponge_id TEXT REFERENCES sponges (id),
  filling_id TEXT REFERENCES fillings (id),
  covering_id TEXT REFERENCES coverings (id),
  style_id TEXT REFERENCES buttercream_styles (id),
  finish_id TEXT REFERENCES finishes (id),
  colour_hex TEXT CHECK (length(colour_hex) = 7 AND colour_hex GLOB '#*'),
  own_coating INTEGER NOT NULL DEFAULT 0 CHECK (own_coating IN (0, 1)),
  words TEXT,
  words_colour_hex TEXT CHECK (length(words_colour_hex) = 7 AND words_colour_hex GLOB '#*'),
  UNIQUE (item_id, position),
  CHECK (real = 0 OR sponge_id IS NOT NULL),
  CHECK (shape = 'rectangle' OR width_mm = depth_mm)
) STRICT;
CREATE INDEX item_tiers_sponge_id ON item_tiers (sponge_id) WHERE sponge_id IS NOT NULL;
CREATE INDEX item_tiers_filling_id ON item_tiers (filling_id) WHERE filling_id IS NOT NULL;
CREATE INDEX item_tiers_covering_id ON item_tiers (covering_id) WHERE covering_id IS NOT NULL;
CREATE INDEX item_tiers_style_id ON item_tiers (style_id) WHERE style_id IS NOT NULL;
CREATE INDEX item_tiers_finish_id ON item_tiers (finish_id) WHERE finish_id IS NOT NULL;

CREATE TABLE item_decorations (
  id TEXT NOT NULL PRIMARY KEY,
  item_id TEXT NOT NULL REFERENCES order_items (id),
  position INTEGER NOT NULL CHECK (position >= 0),
  decoration_id TEXT NOT NULL REFERENCES decorations (id),
  tier_position INTEGER CHECK (tier_position >= 0),
  quantity INTEGER NOT NULL CHECK (quantity >= 1),
  colour_hex TEXT CHECK (length(colour_hex) = 7 AND colour_hex GLOB '#*'),
  source TEXT NOT NULL CHECK (source IN ('studio', 'customer', 'florist')),
  note TEXT NOT NULL DEFAULT '',
  UNIQUE (item_id, position)
) STRICT;
CREATE INDEX item_decorations_decoration_id ON item_decorations (decoration_id);

CREATE TABLE item_colours (
  item_id TEXT NOT NULL REFERENCES order_items (id),
  position INTEGER NOT NULL CHECK (position >= 0),
  hex TEXT NOT NULL CHECK (length(hex) = 7 AND hex GLOB '#*'),
  PRIMARY KEY (item_id, position)
) STRICT, WITHOUT ROWID;

CREATE TABLE declared_allergies (
  id TEXT NOT NULL PRIMARY KEY,
  revision_id TEXT NOT NULL REFERENCES order_revisions (id),
  position INTEGER NOT NULL CHECK (position >= 0),
  allergen TEXT CHECK (allergen IN ('gluten-cereals', 'crustaceans', 'egg', 'fish', 'peanut', 'soy', 'milk', 'tree-nuts', 'celery', 'mustard', 'sesame', 'sulphites', 'lupin', 'molluscs')),
  species TEXT,
  free_text TEXT NOT NULL DEFAULT '',
  severity TEXT NOT NULL CHECK (severity IN ('avoids', 'intolerance', 'coeliac', 'allergy', 'anaphylaxis')),
  guests INTEGER NOT NULL CHECK (guests >= 1),
  answer TEXT,
  answered_at TEXT CHECK (answered_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  answered_by_user_id TEXT REFERENCES users (id),
  erased_at TEXT CHECK (erased_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  UNIQUE (revision_id, position)
) STRICT;
CREATE INDEX declared_allergies_allergen ON declared_allergies (allergen) WHERE allergen IS NOT NULL;
CREATE INDEX declared_allergies_answered_by_user_id ON declared_allergies (answered_by_user_id) WHERE answered_by_user_id IS NOT NULL;

CREATE TABLE declared_diets (
  revision_id TEXT NOT NULL REFERENCES order_revisions (id),
  diet TEXT NOT NULL CHECK (diet IN ('vegetarian', 'vegan', 'halal', 'kosher', 'no-alcohol', 'no-gelatine')),
  PRIMARY KEY (revision_id, diet)
) STRICT, WITHOUT ROWID;

CREATE TABLE lifted_stops (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  revision_id TEXT NOT NULL REFERENCES order_revisions (id),
  code TEXT NOT NULL,
  about TEXT NOT NULL,
  reason TEXT NOT NULL,
  lifted_by_user_id TEXT NOT NULL REFERENCES users (id),
  lifted_at TEXT NOT NULL CHECK (lifted_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  accepted_at TEXT CHECK (accepted_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  UNIQUE (revision_id, code, about)
) STRICT;
CREATE INDEX lifted_stops_order_id ON lifted_stops (order_id);
CREATE INDEX lifted_stops_revision_id ON lifted_stops (revision_id);
CREATE INDEX lifted_stops_lifted_by_user_id ON lifted_stops (lifted_by_user_id);

CREATE TABLE quotes (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  revision_id TEXT NOT NULL REFERENCES order_revisions (id),
  n INTEGER NOT NULL CHECK (n >= 1),
  state TEXT NOT NULL CHECK (state IN ('draft', 'sent', 'agreed', 'lapsed', 'withdrawn')),
  terms_text TEXT NOT NULL DEFAULT '',
  note TEXT NOT NULL DEFAULT '',
  total_minor INTEGER NOT NULL,
  deposit_minor INTEGER NOT NULL DEFAULT 0 CHECK (deposit_minor >= 0),
  currency TEXT NOT NULL CHECK (length(currency) = 3),
  expires_at TEXT CHECK (expires_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  deposit_due_at TEXT CHECK (deposit_due_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  balance_due_on TEXT CHECK (balance_due_on = date(balance_due_on)),
  sent_at TEXT CHECK (sent_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  agreed_at TEXT CHECK (agreed_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  agreed_by TEXT CHECK (agreed_by IN ('customer', 'studio')),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_by_user_id TEXT REFERENCES users (id),
  UNIQUE (order_id, n)
) STRICT;
CREATE INDEX quotes_revision_id ON quotes (revision_id);
CREATE INDEX quotes_created_by_user_id ON quotes (created_by_user_id) WHERE created_by_user_id IS NOT NULL;

CREATE TABLE quote_lines (
  id TEXT NOT NULL PRIMARY KEY,
  quote_id TEXT NOT NULL REFERENCES quotes (id),
  position INTEGER NOT NULL CHECK (position >= 0),
  kind TEXT NOT NULL CHECK (kind IN ('tier', 'sheet', 'sponge', 'filling', 'frosting', 'decoration', 'words', 'finish', 'extra', 'pieces', 'stand', 'rush', 'delivery', 'minimum', 'discount', 'tax', 'rounding', 'other')),
  label TEXT NOT NULL,
  quantity INTEGER NOT NULL DEFAULT 1 CHECK (quantity >= 0),
  amount_minor INTEGER NOT NULL,
  tax_category TEXT,
  reason TEXT,
  UNIQUE (quote_id, position)
) STRICT;

CREATE TABLE order_contacts (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  role TEXT NOT NULL CHECK (role IN ('ordered', 'pays', 'collects')),
  name TEXT NOT NULL,
  email TEXT,
  phone TEXT,
  reach_by TEXT NOT NULL DEFAULT 'email' CHECK (reach_by IN ('email', 'phone', 'text')),
  erased_at TEXT CHECK (erased_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  UNIQUE (order_id, role)
) STRICT;
CREATE INDEX order_contacts_email ON order_contacts (email) WHERE email IS NOT NULL;

CREATE TABLE messages (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  sender TEXT NOT NULL CHECK (sender IN ('customer', 'studio', 'system')),
  author_user_id TEXT REFERENCES users (id),
  author_name TEXT NOT NULL DEFAULT '',
  body TEXT NOT NULL,
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  read_at TEXT CHECK (read_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  erased_at TEXT CHECK (erased_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX messages_order_id_created_at ON messages (order_id, created_at);
CREATE INDEX messages_author_user_id ON messages (author_user_id) WHERE author_user_id IS NOT NULL;

CREATE TABLE photos (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT REFERENCES orders (id),
  kind TEXT NOT NULL CHECK (kind IN ('inspiration', 'print', 'finished', 'handover', 'fault')),
  claim_key_hash TEXT,
  uploaded_by_user_id TEXT REFERENCES users (id),
  note TEXT NOT NULL DEFAULT '',
  position INTEGER NOT NULL DEFAULT 0 CHECK (position >= 0),
  width INTEGER NOT NULL CHECK (width >= 1),
  height INTEGER NOT NULL CHECK (height >= 1),
  palette TEXT NOT NULL CHECK (json_valid(palette)),
  files TEXT NOT NULL CHECK (json_valid(files)),
  original_type TEXT NOT NULL,
  bytes INTEGER NOT NULL CHECK (bytes >= 0),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  attached_at TEXT CHECK (attached_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  removed_at TEXT CHECK (removed_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  CHECK ((order_id IS NULL) = (attached_at IS NULL))
) STRICT;
CREATE INDEX photos_attached_at_created_at ON photos (attached_at, created_at);
CREATE INDEX photos_order_id ON photos (order_id) WHERE order_id IS NOT NULL;
CREATE INDEX photos_uploaded_by_user_id ON photos (uploaded_by_user_id) WHERE uploaded_by_user_id IS NOT NULL;

CREATE TABLE order_events (
  order_id TEXT NOT NULL REFERENCES orders (id),
  seq INTEGER NOT NULL CHECK (seq >= 1),
  kind TEXT NOT NULL,
  actor_kind TEXT NOT NULL CHECK (actor_kind IN ('guest', 'customer', 'counter', 'baker', 'owner', 'system')),
  actor_user_id TEXT REFERENCES users (id),
  from_status TEXT CHECK (from_status IN ('asked', 'quoted', 'agreed', 'confirmed', 'making', 'ready', 'collected', 'declined', 'withdrawn', 'lapsed', 'cancelled', 'uncollected')),
  to_status TEXT CHECK (to_status IN ('asked', 'quoted', 'agreed', 'confirmed', 'making', 'ready', 'collected', 'declined', 'withdrawn', 'lapsed', 'cancelled', 'uncollected')),
  data TEXT NOT NULL CHECK (json_valid(data)),
  at TEXT NOT NULL CHECK (at GLOB '????-??-?? ??:??:??.??? +00:00'),
  PRIMARY KEY (order_id, seq)
) STRICT, WITHOUT ROWID;
CREATE INDEX order_events_actor_user_id ON order_events (actor_user_id) WHERE actor_user_id IS NOT NULL;
CREATE TRIGGER order_events_no_update BEFORE UPDATE ON order_events
BEGIN SELECT RAISE(ABORT, 'order_events is never changed in place'); END;
CREATE TRIGGER order_events_no_delete BEFORE DELETE ON order_events
BEGIN SELECT RAISE(ABORT, 'order_events is never changed in place'); END;

CREATE TABLE audit (
  id TEXT NOT NULL PRIMARY KEY,
  at TEXT NOT NULL CHECK (at GLOB '????-??-?? ??:??:??.??? +00:00'),
  actor_kind TEXT NOT NULL CHECK (actor_kind IN ('guest', 'customer', 'counter', 'baker', 'owner', 'system')),
  actor_user_id TEXT REFERENCES users (id),
  action TEXT NOT NULL,
  subject_kind TEXT NOT NULL,
  subject_id TEXT NOT NULL,
  data TEXT NOT NULL CHECK (json_valid(data))
) STRICT;
CREATE INDEX audit_subject_kind_subject_id ON audit (subject_kind, subject_id);
CREATE INDEX audit_at ON audit (at);
CREATE INDEX audit_actor_user_id ON audit (actor_user_id) WHERE actor_user_id IS NOT NULL;
CREATE TRIGGER audit_no_update BEFORE UPDATE ON audit
BEGIN SELECT RAISE(ABORT, 'audit is never changed in place'); END;
CREATE TRIGGER audit_no_delete BEFORE DELETE ON audit
BEGIN SELECT RAISE(ABORT, 'audit is never changed in place'); END;

CREATE TABLE handovers (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  collected_by TEXT NOT NULL,
  condition TEXT NOT NULL DEFAULT '',
  photo_id TEXT REFERENCES photos (id),
  at TEXT NOT NULL CHECK (at GLOB '????-??-?? ??:??:??.??? +00:00'),
  by_user_id TEXT NOT NULL REFERENCES users (id),
  erased_at TEXT CHECK (erased_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX handovers_order_id ON handovers (order_id);
CREATE INDEX handovers_photo_id ON handovers (photo_id) WHERE photo_id IS NOT NULL;
CREATE INDEX handovers_by_user_id ON handovers (by_user_id);

-- A settled quote never changes, nor do its lines once it has been sent.
CREATE TRIGGER quotes_settled BEFORE UPDATE ON quotes
WHEN OLD.state IN ('agreed', 'lapsed', 'withdrawn')
  -- Blanking the note, which is written to a person, is all that erasing needs.
  AND NOT (NEW.note = ''
    AND NEW.id = OLD.id AND NEW.order_id = OLD.order_id AND NEW.revision_id = OLD.revision_id
    AND NEW.n = OLD.n AND NEW.state = OLD.state AND NEW.terms_text = OLD.terms_text
    AND NEW.total_minor = OLD.total_minor AND NEW.deposit_minor = OLD.deposit_minor
    AND NEW.currency = OLD.currency AND NEW.expires_at IS OLD.expires_at
    AND NEW.deposit_due_at IS OLD.deposit_due_at AND NEW.balance_due_on IS OLD.balance_due_on
    AND NEW.sent_at IS OLD.sent_at AND NEW.agreed_at IS OLD.agreed_at
    AND NEW.agreed_by IS OLD.agreed_by AND NEW.created_at = OLD.created_at
    AND NEW.created_by_user_id IS OLD.created_by_user_id)
BEGIN SELECT RAISE(ABORT, 'a settled quote is never changed'); END;
CREATE TRIGGER quotes_no_delete BEFORE DELETE ON quotes WHEN OLD.state <> 'draft'
BEGIN SELECT RAISE(ABORT, 'a sent quote is never deleted'); END;
CREATE TRIGGER quote_lines_sent_insert BEFORE INSERT ON quote_lines
WHEN (SELECT state FROM quotes WHERE id = NEW.quote_id) <> 'draft'
BEGIN SELECT RAISE(ABORT, 'the lines of a sent quote are never changed'); END;
CREATE TRIGGER quote_lines_sent_update BEFORE UPDATE ON quote_lines
WHEN (SELECT state FROM quotes WHERE id = OLD.quote_id) <> 'draft'
BEGIN SELECT RAISE(ABORT, 'the lines of a sent quote are never changed'); END;
CREATE TRIGGER quote_lines_sent_delete BEFORE DELETE ON quote_lines
WHEN (SELECT state FROM quotes WHERE id = OLD.quote_id) <> 'draft'
BEGIN SELECT RAISE(ABORT, 'the lines of a sent quote are never changed'); END;
`,
};
