import { BaseError } from 'sequelize';

/**
 * Whether a write failed because a row like it exists. Sequelize reports failed CHECKs and
 * triggers as unique violations too, so SQLite's own words decide.
 */
export function isUniqueViolation(error: unknown): boolean {
  if (!(error instanceof BaseError) || !('parent' in error)) return false;
  const { parent } = error;
  return (
    parent instanceof Error && /\b(?:UNIQUE|PRIMARY KEY) constraint failed\b/.test(parent.message)
  );
}
