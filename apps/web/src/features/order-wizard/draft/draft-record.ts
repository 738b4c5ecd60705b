import * as z from 'zod/mini';
import { submitOrder } from '#shared/contracts/orders.ts';
import { orderSteps } from '#web/config/paths.ts';
import { emptyOrder, type OrderForm } from './empty-order.ts';

/** Raised whenever a stored draft of before could no longer be read. */
export const draftVersion = 1;

/** A draft older than this is dropped: it may hold what somebody told about allergies. */
export const draftKeptDays = 60;

/** What is shown of an uploaded photo until the order exists; the picture itself is the server's. */
export const keptPicture = z.object({
  name: z.string(),
  /** A small JPEG as a data address, or null where this browser cannot read the file. */
  thumbnail: z.nullable(z.string()),
  palette: z.array(z.string()),
});
export type KeptPicture = z.infer<typeof keptPicture>;

/**
 * A try at sending whose end we do not know: the key that makes it one order, and every body sent
 * under it, the first first.
 */
export const sendAttempt = z.object({ key: z.string(), bodies: z.array(z.string()) });
export type SendAttempt = z.infer<typeof sendAttempt>;

const envelope = z.object({
  version: z.literal(draftVersion),
  /** Milliseconds since 1970, by this device's clock. */
  savedAt: z.number(),
  /** Which open page wrote it. */
  writer: z.string(),
  reached: z.enum(orderSteps),
  values: z.unknown(),
  pictures: z.record(z.string(), keptPicture),
  attempt: z.nullable(sendAttempt),
});

export type DraftRecord = Omit<z.infer<typeof envelope>, 'values'> & { readonly values: OrderForm };

const sections = [
  'day',
  'cake',
  'setting',
  'look',
  'extras',
  'photos',
  'you',
  'consents',
  'seenTotalMinor',
  'askWithoutDate',
] as const satisfies readonly (keyof OrderForm)[];

/** Issues that mean "not this shape of thing at all", unlike an answer still missing. */
const structural = new Set(['invalid_type', 'invalid_value', 'invalid_union', 'invalid_key']);

function isObject(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null;
}

function parentOf(root: unknown, path: readonly PropertyKey[]): Record<string, unknown> | null {
  let at: unknown = root;
  for (const part of path.slice(0, -1)) at = isObject(at) ? at[String(part)] : undefined;
  return isObject(at) ? at : null;
}

/** The values have passed every structural rule of the contract; only answers may be missing. */
function isOrderForm(
  values: Record<string, unknown>,
): values is Record<string, unknown> & OrderForm {
  const parsed = submitOrder.safeParse(values);
  return (
    parsed.success ||
    parsed.error.issues.every(
      (issue) => !structural.has(issue.code) || isUnreadNumber(values, issue.path),
    )
  );
}

function isUnreadNumber(values: unknown, path: readonly PropertyKey[]): boolean {
  const last = path.at(-1);
  const value = last === undefined ? undefined : parentOf(values, path)?.[String(last)];
  return typeof value === 'number';
}

/**
 * Form values from whatever was stored. A number that could not be read was stored as null and
 * comes back as NaN; a part that no longer has the contract's shape comes back empty, so that an
 * old or damaged draft loses that part alone.
 */
export function restoreValues(stored: unknown): OrderForm {
  const empty: Record<string, unknown> = emptyOrder();
  const known = isObject(stored) ? stored : {};
  const values: Record<string, unknown> = structuredClone(
    Object.fromEntries(sections.map((name) => [name, name in known ? known[name] : empty[name]])),
  );
  // A draft of before there were cutting cakes has none.
  if (isObject(values['cake'])) values['cake']['cuttingCakes'] ??= [];
  // Numbers first: where the contract wants one and null was stored, the text was unreadable.
  for (const issue of submitOrder.safeParse(values).error?.issues ?? []) {
    const last = issue.path.at(-1);
    const parent = parentOf(values, issue.path);
    if (issue.code !== 'invalid_type' || last === undefined || parent === null) continue;
    const wantsNumber = issue.expected === 'number' || issue.expected === 'int';
    if (wantsNumber && parent[String(last)] === null) parent[String(last)] = Number.NaN;
  }
  for (const issue of submitOrder.safeParse(values).error?.issues ?? []) {
    const section = issue.path[0];
    if (section === undefined || !structural.has(issue.code)) continue;
    if (isUnreadNumber(values, issue.path)) continue;
    values[String(section)] = empty[String(section)];
  }
  return isOrderForm(values) ? values : emptyOrder();
}

/** A draft from the text that was stored, or null if there is none, or none that may be used. */
export function readDraft(text: string | null, now: number): DraftRecord | null {
  if (text === null) return null;
  let json: unknown;
  try {
    json = JSON.parse(text);
  } catch {
    return null;
  }
  const parsed = envelope.safeParse(json);
  if (!parsed.success) return null;
  if (now - parsed.data.savedAt > draftKeptDays * 86_400_000) return null;
  return { ...parsed.data, values: restoreValues(parsed.data.values) };
}

export function writeDraft(record: DraftRecord): string {
  return JSON.stringify(record);
}
