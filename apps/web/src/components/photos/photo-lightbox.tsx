import { useEffect } from 'react';
import type { Photo } from '#shared/contracts/photos.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Modal } from '#web/components/ui/modal.tsx';
import { Palette } from './palette.tsx';
import { photoAlt, photoKindWords, photoSources, photoAddress } from './photo-address.ts';

type Props = {
  readonly photos: readonly Photo[];
  /** Which is open; null closes. */
  readonly at: number | null;
  readonly onAt: (at: number | null) => void;
};

/** Photos as large as the screen, with their notes; arrow keys go from one to the next. */
export function PhotoLightbox({ photos, at, onAt }: Props) {
  const photo = at === null ? undefined : photos[at];
  const count = photos.length;

  useEffect(() => {
    if (at === null) return undefined;
    const onKeyDown = (event: KeyboardEvent) => {
      const step = event.key === 'ArrowRight' ? 1 : event.key === 'ArrowLeft' ? -1 : 0;
      if (step === 0) return;
      event.preventDefault();
      onAt((at + step + count) % count);
    };
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  }, [at, count, onAt]);

  return (
    <Modal
      open={photo !== undefined}
      onClose={() => onAt(null)}
      title={
        photo === undefined || at === null
          ? 'Photo'
          : `${photoKindWords(photo.kind)}${count > 1 ? `, ${at + 1} of ${count}` : ''}`
      }
      className="rim max-h-[96dvh] w-[calc(100%-1rem)] max-w-5xl"
    >
      {photo !== undefined && at !== null && (
        <div className="grid gap-4">
          <img
            key={photo.id}
            src={photoAddress(photo, 1600)}
            srcSet={photoSources(photo)}
            sizes="(min-width: 64rem) 60rem, 92vw"
            width={photo.width}
            height={photo.height}
            alt={photoAlt(photo)}
            className="mx-auto max-h-[66dvh] w-auto max-w-full rounded-mark bg-cloud object-contain"
          />
          <div aria-live="polite" className="grid gap-2">
            {photo.note !== '' && <p>{photo.note}</p>}
            <Palette colours={photo.palette} />
          </div>
          {count > 1 && (
            <div className="flex flex-wrap gap-3">
              <Button kind="secondary" onClick={() => onAt((at - 1 + count) % count)}>
                Photo before
              </Button>
              <Button kind="secondary" onClick={() => onAt((at + 1) % count)}>
                Next photo
              </Button>
            </div>
          )}
        </div>
      )}
    </Modal>
  );
}
