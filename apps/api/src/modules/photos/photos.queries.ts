import { Op } from 'sequelize';
import type { Photo as PhotoView } from '#shared/contracts/photos.ts';
import { Photo } from '#api/db/models/photo.ts';

/** A picture that is still there, or null. */
export function findPhoto(id: string): Promise<Photo | null> {
  return Photo.findOne({ where: { id, removedAt: null } });
}

/** The pictures of orders, in the order they were given, by the order's id. */
export async function photosOf(orderIds: readonly string[]): Promise<Map<string, PhotoView[]>> {
  const photos = await Photo.findAll({
    where: { orderId: { [Op.in]: [...orderIds] }, removedAt: null },
    order: [
      ['position', 'ASC'],
      ['createdAt', 'ASC'],
    ],
  });
  const views = new Map<string, PhotoView[]>(orderIds.map((id) => [id, []]));
  for (const photo of photos) views.get(photo.orderId ?? '')?.push(presentPhoto(photo));
  return views;
}

/** A picture as the contract has it; where its bytes lie and whose it is stay inside. */
export function presentPhoto(photo: Photo): PhotoView {
  return {
    id: photo.id,
    kind: photo.kind,
    note: photo.note,
    width: photo.width,
    height: photo.height,
    palette: photo.palette,
    widths: [...new Set(photo.files.map(({ width }) => width))].toSorted((a, b) => a - b),
    createdAt: photo.createdAt.toISOString(),
  };
}
