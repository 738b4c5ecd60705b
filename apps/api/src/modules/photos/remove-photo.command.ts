import { changeOne } from '#api/db/change-one.ts';
import { Photo } from '#api/db/models/photo.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { notFound } from '#api/platform/app-error.ts';
import { removePhotoFiles } from './photo-files.ts';

/**
 * Takes back a picture that belongs to no order yet.
 * @throws `not-found` when an order was faster
 */
export async function removePhoto(
  { clock, database }: Pick<Deps, 'clock' | 'database'>,
  id: string,
): Promise<void> {
  const removed = await inTransaction(() =>
    changeOne(Photo, { removedAt: clock.now() }, { id, orderId: null, removedAt: null }),
  );
  if (!removed) throw notFound();
  await removePhotoFiles(database.dataDir, id);
}
