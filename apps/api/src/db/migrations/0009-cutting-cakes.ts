import type { Migration } from './migration.ts';

/**
 * Cutting cakes: an order's item of that kind names its sheet size, as a sheet does, and quotes have
 * a line of their own for them. A CHECK cannot be changed in place, so both tables are made anew.
 */
export const cuttingCakes: Migration = {
  name: '0009-cutting-cakes',
  sql: `
CREATE TABLE new_order_items (
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
  CHECK ((kind IN ('sheet', 'cutting')) = (sheet_size_id IS NOT NULL)),
  CHECK ((kind = 'extra') = (extra_id IS NOT NULL))
) STRICT;
INSERT INTO new_order_items SELECT id, revision_id, position, kind, quantity, sheet_size_id, extra_id, label, stand_deposit_minor, note FROM order_items;
DROP TABLE order_items;
ALTER TABLE new_order_items RENAME TO order_items;
CREATE INDEX order_items_sheet_size_id ON order_items (sheet_size_id) WHERE sheet_size_id IS NOT NULL;
CREATE INDEX order_items_extra_id ON order_items (extra_id) WHERE extra_id IS NOT NULL;

CREATE TABLE new_quote_lines (
  id TEXT NOT NULL PRIMARY KEY,
  quote_id TEXT NOT NULL REFERENCES quotes (id),
  position INTEGER NOT NULL CHECK (position >= 0),
  kind TEXT NOT NULL CHECK (kind IN ('tier', 'sheet', 'cutting-cake', 'sponge', 'filling', 'frosting', 'decoration', 'words', 'finish', 'extra', 'pieces', 'stand', 'rush', 'delivery', 'minimum', 'discount', 'tax', 'rounding', 'other')),
  label TEXT NOT NULL,
  quantity INTEGER NOT NULL DEFAULT 1 CHECK (quantity >= 0),
  amount_minor INTEGER NOT NULL,
  tax_category TEXT,
  reason TEXT,
  UNIQUE (quote_id, position)
) STRICT;
INSERT INTO new_quote_lines SELECT id, quote_id, position, kind, label, quantity, amount_minor, tax_category, reason FROM quote_lines;
DROP TABLE quote_lines;
ALTER TABLE new_quote_lines RENAME TO quote_lines;
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
