export const photoTypes = ['jpeg', 'png', 'webp', 'gif', 'avif', 'heic'] as const;
export type PhotoType = (typeof photoTypes)[number];

/** How many bytes at the start of a file tell what it is. */
export const headLength = 32;

const avifBrands = ['avif', 'avis'];
/** ISO/IEC 23008-12 Annex B: HEVC images and sequences; `mif1` and `msf1` say only HEIF. */
const heicBrands = ['heic', 'heix', 'heim', 'heis', 'hevc', 'hevx', 'mif1', 'msf1'];

/**
 * What a file is by its first bytes, whatever its name says; null for what we do not read. SVG is
 * text and so never a photo.
 */
export function photoTypeOf(head: Uint8Array): PhotoType | null {
  const bytes = Buffer.from(head);
  const text = (from: number, to: number) => bytes.toString('latin1', from, to);
  if (bytes[0] === 0xff && bytes[1] === 0xd8 && bytes[2] === 0xff) return 'jpeg';
  if (text(0, 8) === '\x89PNG\r\n\x1a\n') return 'png';
  if (text(0, 6) === 'GIF87a' || text(0, 6) === 'GIF89a') return 'gif';
  if (text(0, 4) === 'RIFF' && text(8, 12) === 'WEBP') return 'webp';
  if (text(4, 8) !== 'ftyp') return null;
  const brands = [text(8, 12), text(16, 20), text(20, 24), text(24, 28), text(28, 32)];
  if (brands.some((brand) => avifBrands.includes(brand))) return 'avif';
  return brands.some((brand) => heicBrands.includes(brand)) ? 'heic' : null;
}
