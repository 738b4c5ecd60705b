import { promisify } from 'node:util';
import { brotliCompress, gzip } from 'node:zlib';
import { createHash } from 'node:crypto';
import type { Menu } from '#shared/contracts/menu.ts';
import { currentClock, currentDatabase } from '#api/db/current-database.ts';
import type { Database } from '#api/db/database.ts';
import { readPlanVersions } from '#api/db/plan-versions.ts';
import { loadMenu } from './load-menu.ts';

/** The menu with the bytes that are sent, made once. */
export type PreparedMenu = {
  readonly menu: Menu;
  readonly etag: string;
  readonly identity: Buffer;
  readonly gzip: Buffer;
  readonly br: Buffer;
};

type Kept = {
  readonly database: Database;
  readonly catalogueVersion: number;
  readonly prepared: PreparedMenu;
  /** `performance.now()` of the last look at the version. */
  lookedAt: number;
};

/**
 * A busy page may be this much behind a change of the catalogue; looking at the version for every
 * request would cost more than the answer. Whoever must be exact asks for `freshMenu`.
 */
const lookEveryMs = 1000;

let kept: Kept | null = null;
let loading: Promise<PreparedMenu> | null = null;

/** The menu to read and to estimate by, at most a second old. */
export async function preparedMenu(): Promise<PreparedMenu> {
  if (
    kept !== null &&
    kept.database === currentDatabase() &&
    performance.now() - kept.lookedAt < lookEveryMs
  ) {
    return kept.prepared;
  }
  return lookAgain();
}

/** The menu as it is in the database now; orders are priced by it. */
export async function freshMenu(): Promise<Menu> {
  // A look that is under way may have begun before the change that must be in it.
  await loading?.catch(() => null);
  return (await lookAgain()).menu;
}

/** Many requests that find the copy old look once together. */
function lookAgain(): Promise<PreparedMenu> {
  loading ??= look().finally(() => {
    loading = null;
  });
  return loading;
}

async function look(): Promise<PreparedMenu> {
  const database = currentDatabase();
  const now = currentClock().now();
  const { catalogueVersion } = await readPlanVersions();
  if (kept?.database === database && kept.catalogueVersion === catalogueVersion) {
    kept.lookedAt = performance.now();
    return kept.prepared;
  }
  const prepared = await prepare(await loadMenu(now));
  kept = { database, catalogueVersion, prepared, lookedAt: performance.now() };
  return prepared;
}

async function prepare(menu: Menu): Promise<PreparedMenu> {
  const identity = Buffer.from(JSON.stringify(menu));
  const [zipped, br] = await Promise.all([
    promisify(gzip)(identity, { level: 9 }),
    promisify(brotliCompress)(identity),
  ]);
  const hash = createHash('sha256').update(identity).digest('base64url');
  return { menu, etag: `"${hash.slice(0, 27)}"`, identity, gzip: zipped, br };
}
