import { useEffect, useState } from 'react';
import type { KeptPicture } from '../draft/draft-record.ts';
import { PhotoQueue, type PhotoQueueOptions } from '../photos/photo-queue.ts';

/** Photos come long after the first page, and what sends them with them. */
const upload: PhotoQueueOptions['upload'] = async (...photo) =>
  (await import('../api/upload-photo.ts')).uploadPhoto(...photo);

const thumbnailOf = async (file: Blob) =>
  (await import('../photos/thumbnail.ts')).thumbnailOf(file);

type Arrived = (id: string, claimKey: string, picture: KeptPicture) => void;

/**
 * The photos on their way, for as long as the wizard is open: they go on while other steps are
 * answered, and at once when the device says that the connection is back.
 */
export function usePhotoQueue(
  onArrived: Arrived,
  later: (run: () => void, ms: number) => () => void,
): PhotoQueue {
  const [queue] = useState(() => new PhotoQueue({ upload, later }));

  useEffect(
    () =>
      queue.onArrival(({ photo, claimKey }, { name, file }) => {
        void thumbnailOf(file).then((thumbnail) =>
          onArrived(photo.id, claimKey, { name, thumbnail, palette: photo.palette }),
        );
      }),
    [queue, onArrived],
  );

  useEffect(() => {
    const again = () => queue.retry();
    // Files on their way do not survive the page; the browser asks before it is closed.
    const ask = (event: BeforeUnloadEvent) => {
      if (queue.snapshot().length > 0) event.preventDefault();
    };
    window.addEventListener('online', again);
    window.addEventListener('beforeunload', ask);
    return () => {
      window.removeEventListener('online', again);
      window.removeEventListener('beforeunload', ask);
    };
  }, [queue]);

  return queue;
}
