import type { Migration } from './migration.ts';

/** The studio, its catalogue and its texts. */
export const studioAndCatalogue: Migration = {
  name: '0001-studio-and-catalogue',
  sql: `
CREATE TABLE studio (
  id INTEGER NOT NULL PRIMARY KEY DEFAULT 1 CHECK (id = 1),
  name TEXT NOT NULL,
  street TEXT NOT NULL,
  town TEXT NOT NULL,
  region TEXT NOT NULL,
  postcode TEXT NOT NULL,
  country TEXT NOT NULL CHECK (length(country) = 2),
  phone TEXT NOT NULL,
  email TEXT NOT NULL,
  zone TEXT NOT NULL,
  currency TEXT NOT NULL CHECK (length(currency) = 3),
  locale TEXT NOT NULL,
  label_region TEXT NOT NULL CHECK (label_region IN ('US', 'EU', 'UK')),
  temperature_lead TEXT NOT NULL CHECK (temperature_lead IN ('F', 'C')),
  length_lead TEXT NOT NULL CHECK (length_lead IN ('in', 'cm')),
  altitude_m INTEGER NOT NULL DEFAULT 0,
  first_order_number INTEGER NOT NULL DEFAULT 2401 CHECK (first_order_number >= 1),
  answer_hours INTEGER NOT NULL DEFAULT 48 CHECK (answer_hours >= 1),
  guest_hold_minutes INTEGER NOT NULL DEFAULT 30 CHECK (guest_hold_minutes >= 1),
  holds_per_email INTEGER NOT NULL DEFAULT 3 CHECK (holds_per_email >= 1),
  holds_per_address INTEGER NOT NULL DEFAULT 5 CHECK (holds_per_address >= 1),
  book_open_months INTEGER NOT NULL DEFAULT 18 CHECK (book_open_months >= 1),
  regulars_kept_back INTEGER NOT NULL DEFAULT 0 CHECK (regulars_kept_back >= 0),
  utilisation_ppm INTEGER NOT NULL DEFAULT 700000 CHECK (utilisation_ppm BETWEEN 0 AND 1000000),
  dessert_factor_ppm INTEGER NOT NULL DEFAULT 700000 CHECK (dessert_factor_ppm BETWEEN 0 AND 1000000),
  monthly_warmest_c TEXT NOT NULL CHECK (json_valid(monthly_warmest_c)),
  default_portion_size_id TEXT NOT NULL REFERENCES portion_sizes (id),
  words_per_decimetre INTEGER NOT NULL DEFAULT 13 CHECK (words_per_decimetre >= 1),
  offers_delivery INTEGER NOT NULL DEFAULT 0 CHECK (offers_delivery IN (0, 1)),
  offers_set_up INTEGER NOT NULL DEFAULT 0 CHECK (offers_set_up IN (0, 1)),
  require_second_factor INTEGER NOT NULL DEFAULT 1 CHECK (require_second_factor IN (0, 1)),
  max_photos INTEGER NOT NULL DEFAULT 8 CHECK (max_photos >= 1),
  max_photo_bytes INTEGER NOT NULL DEFAULT 26214400 CHECK (max_photo_bytes >= 1),
  max_photo_pixels INTEGER NOT NULL DEFAULT 50000000 CHECK (max_photo_pixels >= 1),
  kitchen TEXT NOT NULL CHECK (json_valid(kitchen)),
  kitchen_notice TEXT NOT NULL,
  home_kitchen_text TEXT NOT NULL,
  egg_advisory TEXT NOT NULL
) STRICT;
CREATE INDEX studio_default_portion_size_id ON studio (default_portion_size_id);

CREATE TABLE plan_state (
  id INTEGER NOT NULL PRIMARY KEY DEFAULT 1 CHECK (id = 1),
  plan_version INTEGER NOT NULL DEFAULT 0 CHECK (plan_version >= 0),
  settings_version INTEGER NOT NULL DEFAULT 0 CHECK (settings_version >= 0),
  catalogue_version INTEGER NOT NULL DEFAULT 0 CHECK (catalogue_version >= 0)
) STRICT;

CREATE TABLE tier_sizes (
  id TEXT NOT NULL PRIMARY KEY,
  shape TEXT NOT NULL CHECK (shape IN ('round', 'square', 'rectangle')),
  width_mm INTEGER NOT NULL CHECK (width_mm >= 1),
  depth_mm INTEGER NOT NULL CHECK (depth_mm >= 1),
  heights_mm TEXT NOT NULL CHECK (json_valid(heights_mm)),
  position INTEGER NOT NULL DEFAULT 0,
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  UNIQUE (shape, width_mm, depth_mm),
  CHECK (shape = 'rectangle' OR width_mm = depth_mm)
) STRICT;

CREATE TABLE sheet_sizes (
  id TEXT NOT NULL PRIMARY KEY,
  name TEXT NOT NULL,
  width_mm INTEGER NOT NULL CHECK (width_mm >= 1),
  depth_mm INTEGER NOT NULL CHECK (depth_mm >= 1),
  height_mm INTEGER NOT NULL CHECK (height_mm >= 1),
  cut_width_mm INTEGER NOT NULL DEFAULT 50 CHECK (cut_width_mm >= 1),
  cut_depth_mm INTEGER NOT NULL DEFAULT 50 CHECK (cut_depth_mm >= 1),
  position INTEGER NOT NULL DEFAULT 0,
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;

CREATE TABLE portion_sizes (
  id TEXT NOT NULL PRIMARY KEY,
  name TEXT NOT NULL,
  blurb TEXT NOT NULL DEFAULT '',
  width_mm INTEGER NOT NULL CHECK (width_mm >= 1),
  depth_mm INTEGER NOT NULL CHECK (depth_mm >= 1),
  position INTEGER NOT NULL DEFAULT 0,
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;

CREATE TABLE occasions (
  id TEXT NOT NULL PRIMARY KEY,
  name TEXT NOT NULL,
  notice_days INTEGER NOT NULL DEFAULT 0 CHECK (notice_days >= 0),
  position INTEGER NOT NULL DEFAULT 0,
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;

CREATE TABLE sponges (
  id TEXT NOT NULL PRIMARY KEY,
  name TEXT NOT NULL,
  blurb TEXT NOT NULL DEFAULT '',
  formula_id TEXT NOT NULL REFERENCES formulas (id),
  levelling_ppm INTEGER NOT NULL DEFAULT 80000 CHECK (levelling_ppm BETWEEN 0 AND 1000000),
  colour_hex TEXT NOT NULL CHECK (length(colour_hex) = 7 AND colour_hex GLOB '#*'),
  position INTEGER NOT NULL DEFAULT 0,
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX sponges_formula_id ON sponges (formula_id);

CREATE TABLE fillings (
  id TEXT NOT NULL PRIMARY KEY,
  name TEXT NOT NULL,
  blurb TEXT NOT NULL DEFAULT '',
  formula_id TEXT NOT NULL REFERENCES formulas (id),
  colour_hex TEXT NOT NULL CHECK (length(colour_hex) = 7 AND colour_hex GLOB '#*'),
  thickness_um INTEGER NOT NULL DEFAULT 6000 CHECK (thickness_um >= 1),
  soft INTEGER NOT NULL DEFAULT 0 CHECK (soft IN (0, 1)),
  position INTEGER NOT NULL DEFAULT 0,
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX fillings_formula_id ON fillings (formula_id);

CREATE TABLE buttercream_styles (
  id TEXT NOT NULL PRIMARY KEY CHECK (id IN ('american', 'swiss', 'italian', 'french', 'german', 'russian')),
  name TEXT NOT NULL,
  blurb TEXT NOT NULL DEFAULT '',
  how TEXT NOT NULL DEFAULT '',
  best_for TEXT NOT NULL DEFAULT '',
  formula_id TEXT NOT NULL REFERENCES formulas (id),
  sweetness INTEGER NOT NULL CHECK (sweetness BETWEEN 1 AND 5),
  smoothness INTEGER NOT NULL CHECK (smoothness BETWEEN 1 AND 5),
  detail TEXT NOT NULL CHECK (detail IN ('none', 'soft', 'fine')),
  crusts INTEGER NOT NULL DEFAULT 0 CHECK (crusts IN (0, 1)),
  position INTEGER NOT NULL DEFAULT 0,
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX buttercream_styles_formula_id ON buttercream_styles (formula_id);

CREATE TABLE coverings (
  id TEXT NOT NULL PRIMARY KEY CHECK (id IN ('buttercream', 'fondant', 'ganache', 'semi-naked')),
  name TEXT NOT NULL,
  blurb TEXT NOT NULL DEFAULT '',
  formula_id TEXT REFERENCES formulas (id),
  colour_hex TEXT NOT NULL CHECK (length(colour_hex) = 7 AND colour_hex GLOB '#*'),
  crumb_coat_um INTEGER NOT NULL CHECK (crumb_coat_um >= 0),
  final_coat_um INTEGER NOT NULL CHECK (final_coat_um >= 0),
  holds_to_c REAL,
  detail TEXT NOT NULL CHECK (detail IN ('none', 'soft', 'fine')),
  position INTEGER NOT NULL DEFAULT 0,
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX coverings_formula_id ON coverings (formula_id) WHERE formula_id IS NOT NULL;

CREATE TABLE finishes (
  id TEXT NOT NULL PRIMARY KEY CHECK (id IN ('smooth', 'textured', 'piped')),
  name TEXT NOT NULL,
  blurb TEXT NOT NULL DEFAULT '',
  position INTEGER NOT NULL DEFAULT 0,
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;

CREATE TABLE covering_finishes (
  covering_id TEXT NOT NULL REFERENCES coverings (id),
  finish_id TEXT NOT NULL REFERENCES finishes (id),
  PRIMARY KEY (covering_id, finish_id)
) STRICT, WITHOUT ROWID;
CREATE INDEX covering_finishes_finish_id ON covering_finishes (finish_id);

CREATE TABLE decorations (
  id TEXT NOT NULL PRIMARY KEY,
  name TEXT NOT NULL,
  blurb TEXT NOT NULL DEFAULT '',
  glyph TEXT NOT NULL CHECK (glyph IN ('flower', 'leaf', 'pearl', 'border', 'figure', 'topper', 'fruit', 'drip', 'print', 'ribbon', 'sprinkle')),
  edge TEXT NOT NULL CHECK (edge IN ('edible', 'food-contact-only', 'remove-before-eating')),
  sources TEXT NOT NULL CHECK (json_valid(sources)),
  detail TEXT NOT NULL CHECK (detail IN ('none', 'soft', 'fine')),
  per TEXT NOT NULL CHECK (per IN ('piece', 'tier', 'cake')),
  minutes INTEGER NOT NULL CHECK (minutes >= 0),
  materials_cost_minor INTEGER NOT NULL DEFAULT 0 CHECK (materials_cost_minor >= 0),
  weight_mg INTEGER NOT NULL CHECK (weight_mg >= 0),
  arrive_by_hours INTEGER CHECK (arrive_by_hours >= 0),
  notice_days INTEGER NOT NULL DEFAULT 0 CHECK (notice_days >= 0),
  made_ahead INTEGER NOT NULL DEFAULT 0 CHECK (made_ahead IN (0, 1)),
  keeps_days INTEGER CHECK (keeps_days >= 0),
  skill_id TEXT REFERENCES skills (id),
  formula_id TEXT REFERENCES formulas (id),
  colourable INTEGER NOT NULL DEFAULT 0 CHECK (colourable IN (0, 1)),
  small_parts INTEGER NOT NULL DEFAULT 0 CHECK (small_parts IN (0, 1)),
  caution TEXT NOT NULL DEFAULT '',
  position INTEGER NOT NULL DEFAULT 0,
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX decorations_skill_id ON decorations (skill_id) WHERE skill_id IS NOT NULL;
CREATE INDEX decorations_formula_id ON decorations (formula_id) WHERE formula_id IS NOT NULL;

CREATE TABLE decoration_ingredients (
  decoration_id TEXT NOT NULL REFERENCES decorations (id),
  ingredient_id TEXT NOT NULL REFERENCES ingredients (id),
  weight_mg INTEGER NOT NULL CHECK (weight_mg >= 0),
  PRIMARY KEY (decoration_id, ingredient_id)
) STRICT, WITHOUT ROWID;
CREATE INDEX decoration_ingredients_ingredient_id ON decoration_ingredients (ingredient_id);

CREATE TABLE extras (
  id TEXT NOT NULL PRIMARY KEY,
  name TEXT NOT NULL,
  blurb TEXT NOT NULL DEFAULT '',
  kind TEXT NOT NULL CHECK (kind IN ('candles', 'knife', 'topper', 'other')),
  cost_minor INTEGER NOT NULL DEFAULT 0 CHECK (cost_minor >= 0),
  tax_category TEXT NOT NULL,
  position INTEGER NOT NULL DEFAULT 0,
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;

CREATE TABLE kitchen_allergens (
  allergen TEXT NOT NULL PRIMARY KEY CHECK (allergen IN ('gluten-cereals', 'crustaceans', 'egg', 'fish', 'peanut', 'soy', 'milk', 'tree-nuts', 'celery', 'mustard', 'sesame', 'sulphites', 'lupin', 'molluscs')),
  handled INTEGER NOT NULL DEFAULT 0 CHECK (handled IN (0, 1)),
  assessment TEXT,
  assessed_on TEXT CHECK (assessed_on = date(assessed_on))
) STRICT;

CREATE TABLE allergy_rules (
  id TEXT NOT NULL PRIMARY KEY,
  allergen TEXT CHECK (allergen IN ('gluten-cereals', 'crustaceans', 'egg', 'fish', 'peanut', 'soy', 'milk', 'tree-nuts', 'celery', 'mustard', 'sesame', 'sulphites', 'lupin', 'molluscs')),
  severity TEXT NOT NULL CHECK (severity IN ('avoids', 'intolerance', 'coeliac', 'allergy', 'anaphylaxis')),
  answer TEXT NOT NULL CHECK (answer IN ('take', 'talk', 'refuse'))
) STRICT;
CREATE UNIQUE INDEX allergy_rules_severity_once ON allergy_rules (severity, coalesce(allergen, ''));

CREATE TABLE email_texts (
  template TEXT NOT NULL PRIMARY KEY,
  subject TEXT NOT NULL,
  lead TEXT NOT NULL,
  closing TEXT NOT NULL DEFAULT '',
  updated_at TEXT NOT NULL CHECK (updated_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;

CREATE TABLE price_book_versions (
  id TEXT NOT NULL PRIMARY KEY,
  n INTEGER NOT NULL UNIQUE CHECK (n >= 1),
  content TEXT NOT NULL CHECK (json_valid(content)),
  valid_from TEXT NOT NULL CHECK (valid_from GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_by_user_id TEXT REFERENCES users (id)
) STRICT;
CREATE INDEX price_book_versions_created_by_user_id ON price_book_versions (created_by_user_id) WHERE created_by_user_id IS NOT NULL;
CREATE TRIGGER price_book_versions_no_update BEFORE UPDATE ON price_book_versions
BEGIN SELECT RAISE(ABORT, 'price_book_versions is never changed in place'); END;
CREATE TRIGGER price_book_versions_no_delete BEFORE DELETE ON price_book_versions
BEGIN SELECT RAISE(ABORT, 'price_book_versions is never changed in place'); END;

CREATE TABLE policy_versions (
  id TEXT NOT NULL PRIMARY KEY,
  kind TEXT NOT NULL CHECK (kind IN ('privacy', 'terms', 'allergy', 'cancellation', 'photo')),
  n INTEGER NOT NULL CHECK (n >= 1),
  title TEXT NOT NULL,
  text TEXT NOT NULL,
  valid_from TEXT NOT NULL CHECK (valid_from GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_by_user_id TEXT REFERENCES users (id),
  UNIQUE (kind, n)
) STRICT;
CREATE INDEX policy_versions_created_by_user_id ON policy_versions (created_by_user_id) WHERE created_by_user_id IS NOT NULL;
CREATE TRIGGER policy_versions_no_update BEFORE UPDATE ON policy_versions
BEGIN SELECT RAISE(ABORT, 'policy_versions is never changed in place'); END;
CREATE TRIGGER policy_versions_no_delete BEFORE DELETE ON policy_versions
BEGIN SELECT RAISE(ABORT, 'policy_versions is never changed in place'); END;

CREATE TABLE work_time_versions (
  id TEXT NOT NULL PRIMARY KEY,
  n INTEGER NOT NULL UNIQUE CHECK (n >= 1),
  content TEXT NOT NULL CHECK (json_valid(content)),
  valid_from TEXT NOT NULL CHECK (valid_from GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_by_user_id TEXT REFERENCES users (id)
) STRICT;
CREATE INDEX work_time_versions_created_by_user_id ON work_time_versions (created_by_user_id) WHERE created_by_user_id IS NOT NULL;
CREATE TRIGGER work_time_versions_no_update BEFORE UPDATE ON work_time_versions
BEGIN SELECT RAISE(ABORT, 'work_time_versions is never changed in place'); END;
CREATE TRIGGER work_time_versions_no_delete BEFORE DELETE ON work_time_versions
BEGIN SELECT RAISE(ABORT, 'work_time_versions is never changed in place'); END;

INSERT INTO plan_state (id) VALUES (1);
`,
};
