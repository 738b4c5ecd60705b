import type { Migration } from './migration.ts';

/** Lines that know their step, versions closed once there is a newer one, and changed contents. */
export const pantryDepth: Migration = {
  name: '0007-pantry-depth',
  sql: `
-- The step a line goes in at was text; the lines themselves stay as they are.
DROP TRIGGER formula_lines_no_update;
ALTER TABLE formula_lines ADD COLUMN step INTEGER NOT NULL DEFAULT 0 CHECK (step >= 0);
UPDATE formula_lines SET step = CAST(coalesce(stage, '0') AS INTEGER);
ALTER TABLE formula_lines DROP COLUMN stage;
CREATE TRIGGER formula_lines_no_update BEFORE UPDATE ON formula_lines
BEGIN SELECT RAISE(ABORT, 'formula_lines is never changed in place'); END;

-- A version is closed when it is the current one, and stays so once another follows it.
DROP TRIGGER formula_lines_closed;
DROP TRIGGER formula_steps_closed;
CREATE TRIGGER formula_lines_closed BEFORE INSERT ON formula_lines
WHEN EXISTS (
  SELECT 1 FROM formula_versions AS own
  JOIN formulas ON formulas.id = own.formula_id
  JOIN formula_versions AS current ON current.id = formulas.current_version_id
  WHERE own.id = NEW.version_id AND own.n <= current.n
)
BEGIN SELECT RAISE(ABORT, 'formula_versions is never changed in place'); END;
CREATE TRIGGER formula_steps_closed BEFORE INSERT ON formula_steps
WHEN EXISTS (
  SELECT 1 FROM formula_versions AS own
  JOIN formulas ON formulas.id = own.formula_id
  JOIN formula_versions AS current ON current.id = formulas.current_version_id
  WHERE own.id = NEW.version_id AND own.n <= current.n
)
BEGIN SELECT RAISE(ABORT, 'formula_versions is never changed in place'); END;

-- What an order contains, where a label or a formula has changed it since the customer was told.
CREATE TABLE content_changes (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  revision_id TEXT NOT NULL REFERENCES order_revisions (id),
  n INTEGER NOT NULL CHECK (n >= 1),
  save_id TEXT NOT NULL,
  ingredient_id TEXT REFERENCES ingredients (id),
  formula_version_id TEXT REFERENCES formula_versions (id),
  told TEXT NOT NULL CHECK (json_valid(told)),
  holds TEXT NOT NULL CHECK (json_valid(holds)),
  advice TEXT NOT NULL CHECK (json_valid(advice)),
  clashes INTEGER NOT NULL CHECK (clashes IN (0, 1)),
  mail_at TEXT NOT NULL CHECK (mail_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  at TEXT NOT NULL CHECK (at GLOB '????-??-?? ??:??:??.??? +00:00'),
  by_user_id TEXT NOT NULL REFERENCES users (id),
  acknowledged_at TEXT CHECK (acknowledged_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  acknowledged_by_user_id TEXT REFERENCES users (id),
  acknowledged_note TEXT NOT NULL DEFAULT '',
  told_at TEXT CHECK (told_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  told_by_user_id TEXT REFERENCES users (id),
  told_how TEXT NOT NULL DEFAULT '',
  ended_at TEXT CHECK (ended_at GLOB '????-??-?? ??:??:??.??? +00:00'),
  UNIQUE (order_id, n),
  CHECK ((ingredient_id IS NULL) <> (formula_version_id IS NULL)),
  CHECK ((acknowledged_at IS NULL) = (acknowledged_by_user_id IS NULL)),
  CHECK ((told_at IS NULL) = (told_by_user_id IS NULL))
) STRICT;
CREATE INDEX content_changes_save_id ON content_changes (save_id);
CREATE INDEX content_changes_revision_id ON content_changes (revision_id);
CREATE INDEX content_changes_ingredient_id ON content_changes (ingredient_id) WHERE ingredient_id IS NOT NULL;
CREATE INDEX content_changes_formula_version_id ON content_changes (formula_version_id) WHERE formula_version_id IS NOT NULL;
CREATE INDEX content_changes_by_user_id ON content_changes (by_user_id);
CREATE INDEX content_changes_acknowledged_by_user_id ON content_changes (acknowledged_by_user_id) WHERE acknowledged_by_user_id IS NOT NULL;
CREATE INDEX content_changes_told_by_user_id ON content_changes (told_by_user_id) WHERE told_by_user_id IS NOT NULL;
`,
};
