import { open, readFile } from 'node:fs/promises';
import sharp from 'sharp';
import type { Sharp } from 'sharp';
import { AppError } from '#api/platform/app-error.ts';
import { decodeHeic } from './decode-heic.ts';
import { paletteOf } from './palette.ts';
import { headLength, photoTypeOf } from './photo-type.ts';
import type { PhotoType } from './photo-type.ts';

/** Widths a page asks for; a smaller picture keeps its own as the last. */
const widths = [480, 1080] as const;
const widest = 2048;
/** WebP ends at 16,383; half of that is taller than any screen needs. */
const tallest = 8192;
const paletteSize = 5;

/** How every size is written. */
export const encodings = { webp: { quality: 78, effort: 2 }, jpeg: { quality: 80 } } as const;

sharp.cache(false);

export type EncodedFile = {
  readonly width: number;
  readonly height: number;
  readonly format: 'webp' | 'jpeg';
  readonly bytes: Buffer;
};

export type EncodedPhoto = {
  readonly type: PhotoType;
  readonly width: number;
  readonly height: number;
  readonly palette: string[];
  /** Smallest first. */
  readonly files: readonly EncodedFile[];
};

type Pixels = { readonly data: Buffer; readonly width: number; readonly height: number };

/**
 * Re-encodes an uploaded picture: turned upright, in sRGB, without metadata, in up to three widths
 * as WebP and JPEG, all from one decode.
 * @throws `unreadable-photo` for what is not a whole picture of a kind we read, `too-large` for
 * one with too many pixels
 */
export async function encodePhoto(file: string, maxPixels: number): Promise<EncodedPhoto> {
  const type = await readType(file);
  const pixels = await decode(file, type, maxPixels);
  const { width, height } = pixels;
  const sizes = [...widths.filter((it) => it < width), width];
  const files: EncodedFile[] = [];
  for (const size of sizes) files.push(...(await encode(pixels, size)));
  return { type, width, height, palette: await readPalette(pixels), files };
}

async function readType(file: string): Promise<PhotoType> {
  const handle = await open(file);
  try {
    const { buffer, bytesRead } = await handle.read(Buffer.alloc(headLength), 0, headLength, 0);
    const type = photoTypeOf(buffer.subarray(0, bytesRead));
    if (type !== null) return type;
  } finally {
    await handle.close();
  }
  throw new AppError('unreadable-photo', {
    detail: 'That is not a picture we can read. Send JPEG, PNG, WebP, AVIF, HEIC or GIF.',
  });
}

/** The whole picture as RGB, at most as large as we keep. */
async function decode(file: string, type: PhotoType, maxPixels: number): Promise<Pixels> {
  try {
    const { width, height } = await sharp(file, { limitInputPixels: false }).metadata();
    if (width * height > maxPixels) throw tooManyPixels(width * height, maxPixels);
    return await toPixels(await source(file, type, maxPixels));
  } catch (error) {
    if (error instanceof AppError) throw error;
    throw new AppError('unreadable-photo', {
      detail: 'This picture is damaged or was cut short on its way. Please send it again.',
      cause: error,
    });
  }
}

async function source(file: string, type: PhotoType, maxPixels: number): Promise<Sharp> {
  if (type !== 'heic') {
    // Damage that hides part of the picture is refused; odd but harmless metadata is not.
    return sharp(file, { limitInputPixels: maxPixels, failOn: 'error', pages: 1 }).autoOrient();
  }
  const { pixels, width, height } = await decodeHeic(await readFile(file), maxPixels);
  return sharp(pixels, { raw: { width, height, channels: 4 }, limitInputPixels: maxPixels });
}

async function toPixels(image: Sharp): Promise<Pixels> {
  const { data, info } = await image
    .timeout({ seconds: 30 })
    .resize({ width: widest, height: tallest, fit: 'inside', withoutEnlargement: true })
    .flatten({ background: '#ffffff' })
    .toColourspace('srgb')
    .raw()
    .toBuffer({ resolveWithObject: true });
  return { data, width: info.width, height: info.height };
}

async function encode(pixels: Pixels, size: number): Promise<EncodedFile[]> {
  const sized = fromPixels(pixels).resize({ width: size });
  const [webp, jpeg] = await Promise.all([
    sized.clone().webp(encodings.webp).toBuffer({ resolveWithObject: true }),
    sized.clone().jpeg(encodings.jpeg).toBuffer({ resolveWithObject: true }),
  ]);
  const { width, height } = webp.info;
  return [
    { width, height, format: 'webp', bytes: webp.data },
    { width, height, format: 'jpeg', bytes: jpeg.data },
  ];
}

async function readPalette(pixels: Pixels): Promise<string[]> {
  const small = await fromPixels(pixels)
    .resize(48, 48, { fit: 'fill', kernel: 'nearest' })
    .raw()
    .toBuffer();
  return paletteOf(small, paletteSize);
}

function fromPixels({ data, width, height }: Pixels): Sharp {
  return sharp(data, { raw: { width, height, channels: 3 } });
}

function tooManyPixels(pixels: number, maxPixels: number): AppError {
  const millions = (count: number) => Math.round(count / 1e6).toLocaleString('en');
  return new AppError('too-large', {
    detail: `This picture has ${millions(pixels)} million pixels; we can take ${millions(maxPixels)} million.`,
  });
}
