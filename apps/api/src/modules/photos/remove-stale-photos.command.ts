import { Op } from 'sequelize';
import { Photo } from '#api/db/models/photo.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { listPhotoFolders, removeOldUploads, removePhotoFiles } from './photo-files.ts';

const dayMs = 86_400_000;

/**
 * Removes pictures that no order claimed within a day, the files of those that were removed, and
 * what a crash left on the disk. Run by the worker now and then; safe to run beside uploads.
 * @returns how many pictures went
 */
export async function removeStalePhotos({
  clock,
  database,
}: Pick<Deps, 'clock' | 'database'>): Promise<number> {
  const now = clock.now();
  const dayAgo = new Date(now.getTime() - dayMs);
  const [stale] = await inTransaction(() =>
    Photo.update(
      { removedAt: now },
      { where: { orderId: null, removedAt: null, createdAt: { [Op.lt]: dayAgo } } },
    ),
  );
  await removeFilesWithoutRow(database.dataDir, new Date(Date.now() - dayMs));
  return stale;
}

/** File ages are by the disk's own clock, so they are compared with that. */
async function removeFilesWithoutRow(dataDir: string, before: Date): Promise<void> {
  await removeOldUploads(dataDir, before);
  const folders = await listPhotoFolders(dataDir);
  const kept = await Photo.findAll({
    attributes: ['id', 'removedAt'],
    where: { id: { [Op.in]: folders.map(({ id }) => id) } },
  });
  const rows = new Map(kept.map((photo) => [photo.id, photo]));
  for (const { id, madeAt } of folders) {
    const row = rows.get(id);
    const orphan = row === undefined && madeAt < before;
    if (orphan || (row !== undefined && row.removedAt !== null))
      await removePhotoFiles(dataDir, id);
  }
}
