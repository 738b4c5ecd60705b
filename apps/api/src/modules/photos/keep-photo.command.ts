import type { PhotoKind } from '#shared/contracts/vocabulary.ts';
import type { Order } from '#api/db/models/order.ts';
import { Photo } from '#api/db/models/photo.ts';
import { Studio } from '#api/db/models/studio.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { noteOrderEvent } from '#api/modules/orders/note-order-event.command.ts';
import { userIdOf } from '#api/platform/actor.ts';
import type { Actor } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import { createGate, GateFull } from '#api/platform/gate.ts';
import { hashKey, newId, newKey } from '#api/platform/ids.ts';
import { encodePhoto } from './encode-photo.ts';
import type { EncodedPhoto } from './encode-photo.ts';
import { removePhotoFiles, writePhotoFiles } from './photo-files.ts';

/** Pictures being re-encoded at once: each takes a core and up to 150 MB while it is unfolded. */
const gate = createGate({ atOnce: 2, waiting: 20 });

/** Staff keep pictures of the making too. */
const maxStaffPhotos = 60;

export type NewPhoto = {
  /** Where the received bytes lie; the route removes them. */
  readonly file: string;
  readonly kind: PhotoKind;
  readonly note: string;
  readonly actor: Actor;
  /** Null before the order exists. */
  readonly order: Order | null;
};

/**
 * Re-encodes a received picture and keeps it, for an order or until one claims it.
 * @returns the key that claims it, null where it has its order already
 * @throws `unreadable-photo`, `too-large`, `too-many-photos`, `unavailable`
 */
export async function keepPhoto(
  deps: Deps,
  input: NewPhoto,
): Promise<{ photo: Photo; claimKey: string | null }> {
  const { dataDir } = deps.database;
  const studio = await Studio.findByPk(1, { rejectOnEmpty: true });
  if (input.order !== null) await limitPhotos(input.order, input.actor, studio.maxPhotos);
  const encoded = await encodeInTurn(input.file, studio.maxPhotoPixels);
  const id = newId();
  await writePhotoFiles(dataDir, id, encoded.files);
  try {
    return await inTransaction(() => writeRow(id, input, encoded, deps, studio.maxPhotos));
  } catch (error) {
    await removePhotoFiles(dataDir, id);
    throw error;
  }
}

async function writeRow(
  id: string,
  { kind, note, actor, order }: NewPhoto,
  encoded: EncodedPhoto,
  { clock }: Deps,
  maxPhotos: number,
): Promise<{ photo: Photo; claimKey: string | null }> {
  if (order !== null) await limitPhotos(order, actor, maxPhotos);
  const claimKey = order === null ? newKey() : null;
  const photo = await Photo.create({
    id,
    orderId: order?.id ?? null,
    attachedAt: order === null ? null : clock.now(),
    position: order === null ? 0 : await Photo.count({ where: { orderId: order.id } }),
    kind,
    note,
    claimKeyHash: claimKey === null ? null : hashKey(claimKey),
    uploadedByUserId: userIdOf(actor),
    width: encoded.width,
    height: encoded.height,
    palette: encoded.palette,
    files: encoded.files.map(({ width, height, format, bytes }) => ({
      width,
      height,
      format,
      bytes: bytes.length,
    })),
    originalType: encoded.type,
    bytes: encoded.files.reduce((sum, { bytes }) => sum + bytes.length, 0),
  });
  if (order !== null) {
    await noteOrderEvent({ orderId: order.id, kind: 'photo-added', actor, data: { photoId: id } });
  }
  return { photo, claimKey };
}

async function encodeInTurn(file: string, maxPixels: number): Promise<EncodedPhoto> {
  try {
    return await gate.run(() => encodePhoto(file, maxPixels));
  } catch (error) {
    if (!(error instanceof GateFull)) throw error;
    throw new AppError('unavailable', {
      detail: 'Many photos are on their way just now. Yours can be sent again in a moment.',
      retryAfterS: 10,
      cause: error,
    });
  }
}

/** Customers' pictures and the studio's own are counted apart. */
async function limitPhotos(order: Order, actor: Actor, maxPhotos: number): Promise<void> {
  const byStaff = actor.kind === 'staff';
  const limit = byStaff ? maxStaffPhotos : maxPhotos;
  const kinds: PhotoKind[] = byStaff ? ['finished', 'handover', 'fault'] : ['inspiration', 'print'];
  const kept = await Photo.count({ where: { orderId: order.id, removedAt: null, kind: kinds } });
  if (kept < limit) return;
  throw new AppError('too-many-photos', {
    detail: `This order has ${kept} photos; more than ${limit} do not fit.`,
  });
}
