import type { Photo } from '#shared/contracts/photos.ts';

/** The address of one size of a photo; the smallest that is wide enough, else the widest. */
export function photoAddress(photo: Photo, wanted: number): string {
  const width = photo.widths.find((it) => it >= wanted) ?? photo.widths.at(-1) ?? wanted;
  return `/api/photos/${encodeURIComponent(photo.id)}/${width}`;
}

/** Every size with its width, for `srcset`. */
export function photoSources(photo: Photo): string {
  return photo.widths
    .map((width) => `/api/photos/${encodeURIComponent(photo.id)}/${width} ${width}w`)
    .join(', ');
}

const kinds: Readonly<Record<Photo['kind'], string>> = {
  inspiration: 'Inspiration',
  print: 'To print',
  finished: 'The finished cake',
  handover: 'At handover',
  fault: 'A fault',
};

/** What a photo is of, for a caption and for those who cannot see it. */
export function photoKindWords(kind: Photo['kind']): string {
  return kinds[kind];
}

/** What stands for the picture in words. */
export function photoAlt(photo: Photo): string {
  return photo.note === '' ? `${kinds[photo.kind]}, photo` : `${kinds[photo.kind]}: ${photo.note}`;
}
