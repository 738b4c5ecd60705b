import type { Migration } from './migration.ts';

/**
 * Each order's cake gets a code of its own, for the page about the cake alone; it grants nothing
 * else. And the owner's word on a label that has to say "not known": what it was given for.
 */
export const careCodes: Migration = {
  name: '0008-care-codes',
  sql: `
ALTER TABLE orders ADD COLUMN care_code TEXT CHECK (length(care_code) = 16);
UPDATE orders SET care_code = hex(randomblob(8));
CREATE UNIQUE INDEX orders_care_code ON orders (care_code) WHERE care_code IS NOT NULL;
ALTER TABLE orders ADD COLUMN unknown_confirmed TEXT;
`,
};
