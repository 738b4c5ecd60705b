import { mkdir, rm, writeFile } from 'node:fs/promises';
import path from 'node:path';
import type { Design } from '#shared/contracts/design.ts';
import type { PhotoClaim } from '#shared/contracts/photos.ts';
import type { PhotoKind } from '#shared/contracts/vocabulary.ts';
import type { Order } from '#api/db/models/order.ts';
import type { Deps } from '#api/modules/deps.ts';
import { openPrivateLink } from '#api/modules/orders/open-private-link.command.ts';
import { submitOrder } from '#api/modules/orders/submit-order.command.ts';
import { keepPhoto } from '#api/modules/photos/keep-photo.command.ts';
import { answerDatesFor } from '#api/modules/plan/plan.queries.ts';
import type { Actor } from '#api/platform/actor.ts';
import { newId } from '#api/platform/ids.ts';
import { privateKeyOf } from '#api/platform/private-link.ts';
import { drawInspiration } from './demo-pictures.ts';
import type { DemoForm } from './demo-parts.ts';

const visitor: Actor = { kind: 'visitor' };

export type Wanted = {
  readonly form: DemoForm;
  /** Pickups are looked for between these days, in this direction. */
  readonly from: string;
  readonly to: string;
  readonly prefer: 'first' | 'last';
  /** Of the open windows of that day, which (from 0; the last where there are fewer). */
  readonly window: number;
  readonly pictures?: readonly Parameters<typeof drawInspiration>[0][];
  /** Whether the customer opened the link in the e-mail. */
  readonly opensLink: boolean;
  /** Also take a day that nobody can promise. */
  readonly askUs?: boolean;
};

/** Sends a demo customer's order as the wizard would; null where the book has no room for it. */
export async function sendDemoOrder(deps: Deps, wanted: Wanted): Promise<Order | null> {
  const pickup = await choosePickup(wanted);
  if (pickup === null) return null;
  const photos: PhotoClaim[] = [];
  for (const [index, drawing] of (wanted.pictures ?? []).entries()) {
    photos.push(await sendPicture(deps, drawing, index));
  }
  const { day, ...form } = wanted.form;
  const { order } = await submitOrder(deps, {
    form: {
      ...form,
      day: { ...day, ...pickup },
      photos,
      seenTotalMinor: null,
      askWithoutDate: wanted.askUs ?? false,
    },
    idempotencyKey: newId(),
    actor: visitor,
    // Everybody from a place of their own: the limit of one place is not for the demo.
    network: form.you.email,
  });
  if (wanted.opensLink) {
    const key = privateKeyOf(deps.env.sessionSecret, order);
    await openPrivateLink(deps, { code: order.code, key });
  }
  return order.reload();
}

/** A drawn picture kept with an order by a member of staff. */
export async function addStaffPicture(
  deps: Deps,
  order: Order,
  kind: PhotoKind,
  actor: Actor,
  drawing: Parameters<typeof drawInspiration>[0],
): Promise<string> {
  const { photo } = await withFile(deps, drawing, (file) =>
    keepPhoto(deps, { file, kind, note: '', actor, order }),
  );
  return photo.id;
}

async function sendPicture(
  deps: Deps,
  drawing: Parameters<typeof drawInspiration>[0],
  index: number,
): Promise<PhotoClaim> {
  const { photo, claimKey } = await withFile(deps, drawing, (file) =>
    keepPhoto(deps, { file, kind: 'inspiration', note: '', actor: visitor, order: null }),
  );
  const note = index === 0 ? 'The feeling of this one' : 'And colors like these';
  return { id: photo.id, claimKey: claimKey ?? '', note };
}

async function withFile<T>(
  deps: Deps,
  drawing: Parameters<typeof drawInspiration>[0],
  work: (file: string) => Promise<T>,
): Promise<T> {
  const folder = path.join(deps.database.dataDir, 'uploads');
  const file = path.join(folder, newId());
  await mkdir(folder, { recursive: true });
  await writeFile(file, await drawInspiration(drawing));
  try {
    return await work(file);
  } finally {
    await rm(file, { force: true });
  }
}

async function choosePickup(wanted: Wanted): Promise<{ date: string; windowStart: number } | null> {
  const { form, from, to, prefer, window, askUs } = wanted;
  const { days } = await answerDatesFor(designOf(form), from, to);
  const good = askUs === true ? ['ask-us'] : ['open', 'last-place'];
  const open = days.filter(({ answer }) => good.includes(answer));
  const day = prefer === 'first' ? open.at(0) : open.at(-1);
  const windows = (day?.windows ?? []).filter(({ answer }) => good.includes(answer));
  const chosen = windows[Math.min(window, windows.length - 1)];
  if (day === undefined || chosen === undefined) return null;
  return { date: day.date, windowStart: chosen.start };
}

function designOf({ day, cake, setting, look, extras }: DemoForm): Design {
  return { guests: day, cake, setting, look, extras };
}
