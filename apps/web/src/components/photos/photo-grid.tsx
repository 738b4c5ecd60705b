import { useState } from 'react';
import type { Photo } from '#shared/contracts/photos.ts';
import { Palette } from './palette.tsx';
import { photoAddress, photoAlt, photoKindWords, photoSources } from './photo-address.ts';
import { PhotoLightbox } from './photo-lightbox.tsx';

/** Photos side by side, each with its note and colours; pressing one shows it large. */
export function PhotoGrid({ photos }: { readonly photos: readonly Photo[] }) {
  const [at, setAt] = useState<number | null>(null);
  return (
    <>
      <ul className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,13rem),1fr))] gap-x-5 gap-y-6">
        {photos.map((photo, place) => (
          <li key={photo.id} className="grid content-start gap-2">
            <button
              type="button"
              onClick={() => setAt(place)}
              aria-label={`See large: ${photoAlt(photo)}`}
              className="block overflow-hidden rounded-action border border-seam bg-cloud"
            >
              <img
                src={photoAddress(photo, 400)}
                srcSet={photoSources(photo)}
                sizes="15rem"
                width={photo.width}
                height={photo.height}
                loading="lazy"
                alt=""
                className="aspect-4/3 w-full object-cover"
              />
            </button>
            <p className="text-sm">
              <span className="font-semibold">{photoKindWords(photo.kind)}</span>
              {photo.note !== '' && <span className="text-slate">: {photo.note}</span>}
            </p>
            <Palette colours={photo.palette} />
          </li>
        ))}
      </ul>
      <PhotoLightbox photos={photos} at={at} onAt={setAt} />
    </>
  );
}
