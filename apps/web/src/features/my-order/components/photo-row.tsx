import type { Photo } from '#shared/contracts/photos.ts';

/** The order's pictures, each with its note. */
export function PhotoRow({ photos }: { readonly photos: readonly Photo[] }) {
  return (
    <ul className="grid grid-cols-2 gap-4 sm:grid-cols-3">
      {photos.map((photo) => (
        <li key={photo.id} className="grid content-start gap-1.5">
          <img
            src={address(photo, 0)}
            srcSet={photo.widths.map((width, at) => `${address(photo, at)} ${width}w`).join(', ')}
            sizes="(min-width: 40rem) 12rem, 45vw"
            width={photo.width}
            height={photo.height}
            alt={photo.note === '' ? `A ${kinds[photo.kind]}` : photo.note}
            loading="lazy"
            className="h-auto w-full rounded-action border border-seam"
          />
          {photo.note !== '' && <p className="text-sm text-slate">{photo.note}</p>}
        </li>
      ))}
    </ul>
  );
}

const kinds = {
  inspiration: 'picture you sent us',
  print: 'picture to be printed',
  finished: 'photo of your finished cake',
  handover: 'photo taken when it was collected',
  fault: 'photo of what went wrong',
} as const;

function address(photo: Photo, at: number): string {
  return `/api/photos/${encodeURIComponent(photo.id)}/${photo.widths[at] ?? photo.width}`;
}
