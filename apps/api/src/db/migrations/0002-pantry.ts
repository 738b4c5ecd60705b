import type { Migration } from './migration.ts';

/** Ingredients as bought, and formulas by weight. */
export const pantry: Migration = {
  name: '0002-pantry',
  sql: `
CREATE TABLE ingredients (
  id TEXT NOT NULL PRIMARY KEY,
  name TEXT NOT NULL,
  brand TEXT,
  label_name TEXT NOT NULL,
  label_contents TEXT,
  label_checked_on TEXT CHECK (label_checked_on = date(label_checked_on)),
  family TEXT NOT NULL CHECK (family IN ('flour', 'sugar', 'butter', 'fat', 'egg', 'dairy', 'raising', 'starch', 'fruit', 'nut', 'chocolate', 'flavour', 'colour', 'gelling', 'salt', 'liquid', 'other')),
  pack_mg INTEGER CHECK (pack_mg >= 1),
  pack_price_minor INTEGER CHECK (pack_price_minor >= 0),
  density_mg_per_ml INTEGER CHECK (density_mg_per_ml >= 1),
  rounding_mg INTEGER NOT NULL DEFAULT 1000 CHECK (rounding_mg >= 1),
  egg_part TEXT CHECK (egg_part IN ('whole', 'white', 'yolk')),
  pasteurised TEXT NOT NULL DEFAULT 'unknown' CHECK (pasteurised IN ('yes', 'no', 'unknown')),
  gelatine TEXT NOT NULL DEFAULT 'unknown' CHECK (gelatine IN ('yes', 'no', 'unknown')),
  alcohol TEXT NOT NULL DEFAULT 'unknown' CHECK (alcohol IN ('yes', 'no', 'unknown')),
  cochineal TEXT NOT NULL DEFAULT 'unknown' CHECK (cochineal IN ('yes', 'no', 'unknown')),
  animal_origin TEXT NOT NULL DEFAULT 'unknown' CHECK (animal_origin IN ('yes', 'no', 'unknown')),
  honey TEXT NOT NULL DEFAULT 'unknown' CHECK (honey IN ('yes', 'no', 'unknown')),
  handled_note TEXT,
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;

CREATE TABLE ingredient_allergens (
  id TEXT NOT NULL PRIMARY KEY,
  ingredient_id TEXT NOT NULL REFERENCES ingredients (id),
  allergen TEXT NOT NULL CHECK (allergen IN ('gluten-cereals', 'crustaceans', 'egg', 'fish', 'peanut', 'soy', 'milk', 'tree-nuts', 'celery', 'mustard', 'sesame', 'sulphites', 'lupin', 'molluscs')),
  species TEXT,
  state TEXT NOT NULL CHECK (state IN ('contains', 'may-contain', 'not-declared', 'unknown'))
) STRICT;
CREATE UNIQUE INDEX ingredient_allergens_ingredient_id_once ON ingredient_allergens (ingredient_id, allergen, coalesce(species, ''));

CREATE TABLE ingredient_measures (
  id TEXT NOT NULL PRIMARY KEY,
  ingredient_id TEXT NOT NULL REFERENCES ingredients (id),
  measure TEXT NOT NULL CHECK (measure IN ('cup', 'tablespoon', 'teaspoon', 'stick', 'can', 'piece', 'pinch')),
  qualifier TEXT,
  weight_mg INTEGER NOT NULL CHECK (weight_mg >= 1),
  source TEXT
) STRICT;
CREATE UNIQUE INDEX ingredient_measures_ingredient_id_once ON ingredient_measures (ingredient_id, measure, coalesce(qualifier, ''));

CREATE TABLE formulas (
  id TEXT NOT NULL PRIMARY KEY,
  kind TEXT NOT NULL CHECK (kind IN ('sponge', 'filling', 'buttercream', 'custard', 'other')),
  name TEXT NOT NULL,
  current_version_id TEXT REFERENCES formula_versions (id),
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  archived_at TEXT CHECK (archived_at GLOB '????-??-?? ??:??:??.??? +00:00')
) STRICT;
CREATE INDEX formulas_current_version_id ON formulas (current_version_id) WHERE current_version_id IS NOT NULL;

CREATE TABLE formula_versions (
  id TEXT NOT NULL PRIMARY KEY,
  formula_id TEXT NOT NULL REFERENCES formulas (id),
  n INTEGER NOT NULL CHECK (n >= 1),
  yield_ppm INTEGER NOT NULL CHECK (yield_ppm BETWEEN 1 AND 1000000),
  density_mg_per_ml INTEGER NOT NULL CHECK (density_mg_per_ml >= 1),
  bake_loss_ppm INTEGER NOT NULL DEFAULT 0 CHECK (bake_loss_ppm BETWEEN 0 AND 1000000),
  base_colour_hex TEXT CHECK (length(base_colour_hex) = 7 AND base_colour_hex GLOB '#*'),
  keeps_room_hours INTEGER CHECK (keeps_room_hours >= 0),
  keeps_chilled_hours INTEGER CHECK (keeps_chilled_hours >= 0),
  keeps_frozen_hours INTEGER CHECK (keeps_frozen_hours >= 0),
  holds_to_c REAL,
  refrigerate INTEGER NOT NULL DEFAULT 1 CHECK (refrigerate IN (0, 1)),
  pasteurised_by_default INTEGER NOT NULL DEFAULT 0 CHECK (pasteurised_by_default IN (0, 1)),
  note TEXT NOT NULL DEFAULT '',
  created_at TEXT NOT NULL CHECK (created_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  created_by_user_id TEXT REFERENCES users (id),
  UNIQUE (formula_id, n)
) STRICT;
CREATE INDEX formula_versions_created_by_user_id ON formula_versions (created_by_user_id) WHERE created_by_user_id IS NOT NULL;
CREATE TRIGGER formula_versions_no_update BEFORE UPDATE ON formula_versions
BEGIN SELECT RAISE(ABORT, 'formula_versions is never changed in place'); END;
CREATE TRIGGER formula_versions_no_delete BEFORE DELETE ON formula_versions
BEGIN SELECT RAISE(ABORT, 'formula_versions is never changed in place'); END;

CREATE TABLE formula_lines (
  id TEXT NOT NULL PRIMARY KEY,
  version_id TEXT NOT NULL REFERENCES formula_versions (id),
  position INTEGER NOT NULL CHECK (position >= 0),
  ingredient_id TEXT REFERENCES ingredients (id),
  formula_version_id TEXT REFERENCES formula_versions (id),
  weight_mg INTEGER NOT NULL CHECK (weight_mg >= 1),
  as_typed TEXT,
  stage TEXT,
  UNIQUE (version_id, position),
  CHECK ((ingredient_id IS NULL) <> (formula_version_id IS NULL))
) STRICT;
CREATE INDEX formula_lines_ingredient_id ON formula_lines (ingredient_id) WHERE ingredient_id IS NOT NULL;
CREATE INDEX formula_lines_formula_version_id ON formula_lines (formula_version_id) WHERE formula_version_id IS NOT NULL;
CREATE TRIGGER formula_lines_no_update BEFORE UPDATE ON formula_lines
BEGIN SELECT RAISE(ABORT, 'formula_lines is never changed in place'); END;
CREATE TRIGGER formula_lines_no_delete BEFORE DELETE ON formula_lines
BEGIN SELECT RAISE(ABORT, 'formula_lines is never changed in place'); END;

CREATE TABLE formula_steps (
  id TEXT NOT NULL PRIMARY KEY,
  version_id TEXT NOT NULL REFERENCES formula_versions (id),
  position INTEGER NOT NULL CHECK (position >= 0),
  text TEXT NOT NULL,
  active_minutes INTEGER NOT NULL DEFAULT 0 CHECK (active_minutes >= 0),
  waiting_minutes INTEGER NOT NULL DEFAULT 0 CHECK (waiting_minutes >= 0),
  resource TEXT NOT NULL CHECK (resource IN ('bench', 'mixer', 'oven', 'cold')),
  critical_limit_c REAL,
  critical_seconds INTEGER CHECK (critical_seconds >= 0),
  critical_note TEXT,
  syrup_target_c REAL,
  UNIQUE (version_id, position)
) STRICT;
CREATE TRIGGER formula_steps_no_update BEFORE UPDATE ON formula_steps
BEGIN SELECT RAISE(ABORT, 'formula_steps is never changed in place'); END;
CREATE TRIGGER formula_steps_no_delete BEFORE DELETE ON formula_steps
BEGIN SELECT RAISE(ABORT, 'formula_steps is never changed in place'); END;

-- A version in use is closed: its lines and steps were all there before it was.
CREATE TRIGGER formula_lines_closed BEFORE INSERT ON formula_lines
WHEN EXISTS (SELECT 1 FROM formulas WHERE current_version_id = NEW.version_id)
BEGIN SELECT RAISE(ABORT, 'formula_versions is never changed in place'); END;
CREATE TRIGGER formula_steps_closed BEFORE INSERT ON formula_steps
WHEN EXISTS (SELECT 1 FROM formulas WHERE current_version_id = NEW.version_id)
BEGIN SELECT RAISE(ABORT, 'formula_versions is never changed in place'); END;
`,
};
