import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import sharp from 'sharp';
import { encodePhoto, encodings } from '#api/modules/photos/encode-photo.ts';
import { atMost, median, type Part } from './report.ts';

const rounds = 7;
const width = 4000;
const height = 3000;
const maxPixels = 50_000_000;

/** Twelve million pixels with something to see at every scale, as a phone's photo has. */
async function phoneSizedJpeg(): Promise<Buffer> {
  const coarse = sharp({
    create: {
      width: width / 20,
      height: height / 20,
      channels: 3,
      background: '#b98',
      noise: { type: 'gaussian', mean: 128, sigma: 60 },
    },
  });
  const grain = await sharp({
    create: {
      width,
      height,
      channels: 3,
      background: '#888',
      noise: { type: 'gaussian', mean: 128, sigma: 12 },
    },
  })
    .png({ compressionLevel: 0 })
    .toBuffer();
  const shapes = await coarse.png().toBuffer();
  return sharp(shapes)
    .resize(width, height, { kernel: 'cubic' })
    .composite([{ input: grain, blend: 'soft-light' }])
    .jpeg({ quality: 90 })
    .toBuffer();
}

/** The same files by sharp alone: one decode, every size from it. */
async function bySharpAlone(file: string, sizes: readonly number[]): Promise<void> {
  const { data, info } = await sharp(file)
    .autoOrient()
    .resize({ width: Math.max(...sizes) })
    .raw()
    .toBuffer({ resolveWithObject: true });
  const decoded = sharp(data, {
    raw: { width: info.width, height: info.height, channels: info.channels },
  });
  for (const size of sizes) {
    const sized = decoded.clone().resize({ width: size });
    await Promise.all([
      sized.clone().webp(encodings.webp).toBuffer(),
      sized.clone().jpeg(encodings.jpeg).toBuffer(),
    ]);
  }
}

async function time(work: () => Promise<unknown>): Promise<number> {
  const started = performance.now();
  await work();
  return performance.now() - started;
}

export const photos: Part = {
  name: 'photos',
  about: 'a 12 MP JPEG through the whole pipeline, against sharp alone making the same files',
  async run(note) {
    const folder = await mkdtemp(path.join(tmpdir(), 'tierwell-bench-'));
    try {
      const file = path.join(folder, 'photo.jpg');
      await writeFile(file, await phoneSizedJpeg());
      const { files } = await encodePhoto(file, maxPixels);
      const sizes = [...new Set(files.map((it) => it.width))];
      const ratios: number[] = [];
      for (let round = 0; round < rounds; round += 1) {
        const alone = await time(() => bySharpAlone(file, sizes));
        const ours = await time(() => encodePhoto(file, maxPixels));
        note(`${ours.toFixed(0)} ms, sharp alone ${alone.toFixed(0)} ms`);
        ratios.push(ours / alone);
      }
      return [atMost('a 12 MP photo to sharp alone', 1.1, median(ratios))];
    } finally {
      await rm(folder, { recursive: true, force: true });
    }
  },
};
