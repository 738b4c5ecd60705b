import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { AppError } from '#api/platform/app-error.ts';
import { encodePhoto } from './encode-photo.ts';

const maxPixels = 50_000_000;
let dir: string;
beforeAll(async () => {
  dir = await mkdtemp(path.join(os.tmpdir(), 'tierwell-photos-'));
});
afterAll(() => rm(dir, { recursive: true }));

async function kept(name: string, bytes: Buffer | string): Promise<string> {
  const file = path.join(dir, name);
  await writeFile(file, bytes);
  return file;
}

const halves = (width: number, height: number) =>
  sharp({ create: { width, height, channels: 3, background: '#b3263e' } }).composite([
    {
      input: { create: { width: width / 2, height, channels: 3, background: '#23429a' } },
      left: 0,
      top: 0,
    },
  ]);

const refusal = (work: Promise<unknown>) =>
  work.then(
    () => 'taken',
    (error: unknown) => (error instanceof AppError ? error.code : error),
  );

describe('re-encoding a photo', () => {
  it('keeps three widths as WebP and JPEG, upright, without metadata', async () => {
    // Orientation 6 of EXIF 2.32: the camera was turned; upright it is 1500 wide and 2400 high.
    const sideways = await halves(2400, 1500)
      .withExif({ IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '42/1 30/1 0/1' } })
      .withMetadata({ orientation: 6 })
      .jpeg()
      .toBuffer();
    expect((await sharp(sideways).metadata()).exif).toBeDefined();
    const photo = await encodePhoto(await kept('a.jpg', sideways), maxPixels);
    expect(photo).toMatchObject({ type: 'jpeg', width: 1500, height: 2400 });
    expect(photo.files.map(({ width, format }) => `${width} ${format}`)).toEqual([
      '480 webp',
      '480 jpeg',
      '1080 webp',
      '1080 jpeg',
      '1500 webp',
      '1500 jpeg',
    ]);
    for (const { bytes, format, width, height } of photo.files) {
      const read = await sharp(bytes).metadata();
      expect(read).toMatchObject({ format, width, height });
      expect([read.exif, read.xmp, read.iptc, read.orientation]).toEqual(Array.from({ length: 4 }));
    }
  });

  it.each(['png', 'webp', 'avif', 'gif'] as const)(
    'reads %s, whatever it is called',
    async (format) => {
      const bytes = await halves(300, 200).toFormat(format).toBuffer();
      const photo = await encodePhoto(await kept(`${format}.jpg`, bytes), maxPixels);
      expect(photo).toMatchObject({ type: format, width: 300, height: 200 });
      expect(photo.files.map(({ width }) => width)).toEqual([300, 300]);
      // Lossless kinds give both colours exactly.
      if (format === 'png') expect(photo.palette).toEqual(['#23429a', '#b3263e']);
    },
  );

  it('reads HEIC in a thread', async () => {
    const fixture = path.join(import.meta.dirname, 'fixtures/two-halves.heic');
    const photo = await encodePhoto(fixture, maxPixels);
    expect(photo).toMatchObject({ type: 'heic', width: 320, height: 200 });
    const [first] = photo.files;
    const [red = 0, , blue = 0] = await sharp(first?.bytes)
      .extract({ left: 20, top: 20, width: 1, height: 1 })
      .raw()
      .toBuffer();
    expect(blue).toBeGreaterThan(red);
  });

  it('takes the first frame of an animation', async () => {
    const frames = await Promise.all(
      ['#112233', '#ffeedd'].map((background) =>
        sharp({ create: { width: 40, height: 30, channels: 3, background } })
          .png()
          .toBuffer(),
      ),
    );
    const gif = await sharp(frames, { join: { animated: true } })
      .gif()
      .toBuffer();
    const photo = await encodePhoto(await kept('moving.gif', gif), maxPixels);
    expect(photo).toMatchObject({ type: 'gif', width: 40, height: 30, palette: ['#112233'] });
  });

  it('puts what is see-through on white', async () => {
    const clear = await sharp({
      create: { width: 20, height: 20, channels: 4, background: { r: 0, g: 0, b: 0, alpha: 0 } },
    })
      .png()
      .toBuffer();
    expect((await encodePhoto(await kept('clear.png', clear), maxPixels)).palette).toEqual([
      '#ffffff',
    ]);
  });

  it('refuses what is no picture, a drawing in text, and one cut short', async () => {
    const jpeg = await halves(900, 600).jpeg().toBuffer();
    const svg = '<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>';
    expect(await refusal(encodePhoto(await kept('a.jpg', 'a list of guests'), maxPixels))).toBe(
      'unreadable-photo',
    );
    expect(await refusal(encodePhoto(await kept('b.jpg', ''), maxPixels))).toBe('unreadable-photo');
    expect(await refusal(encodePhoto(await kept('c.svg', svg), maxPixels))).toBe(
      'unreadable-photo',
    );
    expect(await refusal(encodePhoto(await kept('d.jpg', jpeg.subarray(0, 3000)), maxPixels))).toBe(
      'unreadable-photo',
    );
    const fixture = await sharp({
      create: { width: 64, height: 64, channels: 3, background: '#ffffff' },
    })
      .avif()
      .toBuffer();
    expect(
      await refusal(encodePhoto(await kept('e.heic', fixture.subarray(0, 60)), maxPixels)),
    ).toBe('unreadable-photo');
  });

  it('refuses a small file that would unfold into too many pixels', async () => {
    const bomb = await sharp({
      create: { width: 3000, height: 3000, channels: 3, background: '#ffffff' },
    })
      .png({ compressionLevel: 9 })
      .toBuffer();
    expect(bomb.length).toBeLessThan(100_000);
    expect(await refusal(encodePhoto(await kept('bomb.png', bomb), 8_000_000))).toBe('too-large');
  });
});
