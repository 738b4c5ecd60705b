import { useEffect, useRef, useState } from 'react';
import { uploadPhoto } from '../api/upload-photo.ts';
import type { KeptPicture } from '../draft/draft-record.ts';
import { PhotoQueue } from '../photos/photo-queue.ts';
import { thumbnailOf } from '../photos/thumbnail.ts';

type Arrived = (id: string, claimKey: string, picture: KeptPicture) => void;

/**
 * The photos on their way, for as long as the wizard is open: they go on while other steps are
 * answered, and at once when the device says that the connection is back.
 */
export function usePhotoQueue(
  onArrived: Arrived,
  later: (run: () => void, ms: number) => () => void,
): PhotoQueue {
  const arrived = useRef(onArrived);
  useEffect(() => {
    arrived.current = onArrived;
  }, [onArrived]);

  const [queue] = useState(
    () =>
      new PhotoQueue({
        upload: uploadPhoto,
        later,
        onArrived: ({ photo, claimKey }, { name, file }) => {
          void thumbnailOf(file).then((thumbnail) =>
            arrived.current(photo.id, claimKey, { name, thumbnail, palette: photo.palette }),
          );
        },
      }),
  );

  useEffect(() => {
    const again = () => queue.retry();
    window.addEventListener('online', again);
    return () => window.removeEventListener('online', again);
  }, [queue]);

  return queue;
}
