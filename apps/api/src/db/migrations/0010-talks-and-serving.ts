import type { Migration } from './migration.ts';

/**
 * Talks about stops that no declared allergy stands behind (heat, raw egg, honey), and when the
 * cake is cut.
 */
export const talksAndServing: Migration = {
  name: '0010-talks-and-serving',
  sql: `
CREATE TABLE stop_talks (
  id TEXT NOT NULL PRIMARY KEY,
  order_id TEXT NOT NULL REFERENCES orders (id),
  revision_id TEXT NOT NULL REFERENCES order_revisions (id),
  code TEXT NOT NULL,
  about TEXT NOT NULL,
  text TEXT NOT NULL,
  by_user_id TEXT NOT NULL REFERENCES users (id),
  at TEXT NOT NULL CHECK (at GLOB '????-??-?? ??:??:??.??? +00:00'),
  UNIQUE (revision_id, code, about)
) STRICT;
CREATE INDEX stop_talks_order_id ON stop_talks (order_id);
CREATE INDEX stop_talks_by_user_id ON stop_talks (by_user_id);

ALTER TABLE order_revisions ADD COLUMN setting_served_minute INTEGER
  CHECK (setting_served_minute >= 0 AND setting_served_minute <= 1440);
`,
};
