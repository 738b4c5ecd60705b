import * as z from 'zod/mini';
import { requiredLine } from '#shared/contracts/common.ts';

/** A named way to look at the orders: the address's search, under a name of one's own. */
export const savedView = z.object({
  name: requiredLine(40, 'Give it a name.'),
  search: z.string().check(z.maxLength(1000)),
});
export type SavedView = z.infer<typeof savedView>;

const savedViews = z.array(savedView);
const storeKey = 'tierwell.order-views';

/** The views kept on this device; none where they cannot be read. */
export function readViews(store: Pick<Storage, 'getItem'>): readonly SavedView[] {
  try {
    const parsed = savedViews.safeParse(JSON.parse(store.getItem(storeKey) ?? '[]'));
    return parsed.success ? parsed.data : [];
  } catch {
    return [];
  }
}

/** Keeps the views on this device. Returns whether the device let us. */
export function keepViews(store: Pick<Storage, 'setItem'>, views: readonly SavedView[]): boolean {
  try {
    store.setItem(storeKey, JSON.stringify(views));
    return true;
  } catch {
    return false;
  }
}

/** With a view added; one of the same name is replaced. */
export function withView(views: readonly SavedView[], added: SavedView): readonly SavedView[] {
  return [...views.filter((it) => it.name !== added.name), added].toSorted((a, b) =>
    a.name.localeCompare(b.name),
  );
}
