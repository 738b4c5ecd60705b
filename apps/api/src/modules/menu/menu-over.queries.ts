import type { Menu } from '#shared/contracts/menu.ts';
import type { KitchenBook } from '#shared/kitchen/kitchen-book.ts';
import type { VersionOf } from './cake-parts.queries.ts';
import { loadMenuGround, menuContent } from './load-menu.ts';

/** Makes menus over one pantry or another, parts that are not offered any more included. */
export type MenuOver = (book: KitchenBook, versionOf?: VersionOf) => Menu;

/** Reads the catalogue once, for as many orders as keep versions of their own. */
export async function menuOver(now: Date): Promise<MenuOver> {
  const ground = await loadMenuGround(now, { archivedToo: true });
  return (book, versionOf) => ({ version: 'kept', ...menuContent(ground, book, versionOf) });
}
