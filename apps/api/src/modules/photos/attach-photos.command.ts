import type { PhotoClaim } from '#shared/contracts/photos.ts';
import { changeOne } from '#api/db/change-one.ts';
import { currentClock } from '#api/db/current-database.ts';
import { Photo } from '#api/db/models/photo.ts';
import { AppError } from '#api/platform/app-error.ts';
import { hashKey } from '#api/platform/ids.ts';

/**
 * Gives uploaded pictures to the order being sent, in its transaction: whoever shows a picture's
 * claim key may attach it, once.
 * @throws `invalid-input` at the picture that is gone or somebody else's
 */
export async function attachPhotos(orderId: string, claims: readonly PhotoClaim[]): Promise<void> {
  for (const [position, { id, claimKey, note }] of claims.entries()) {
    const attached = await changeOne(
      Photo,
      { orderId, attachedAt: currentClock().now(), note, position },
      { id, claimKeyHash: hashKey(claimKey), orderId: null, removedAt: null },
    );
    if (attached) continue;
    throw new AppError('invalid-input', {
      issues: [
        {
          path: ['photos', position, 'id'],
          message: 'This photo is not with us any more; please add it again.',
        },
      ],
    });
  }
}
