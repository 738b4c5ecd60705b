import * as z from 'zod/mini';
import { runInThread } from '#api/platform/thread.ts';

const decoded = z.object({
  width: z.int(),
  height: z.int(),
  pixels: z.instanceof(Uint8ClampedArray),
});

/** RGBA, already turned the right way up. */
export type DecodedHeic = z.infer<typeof decoded>;

/**
 * Decodes a HEIC picture with libheif (WebAssembly) in a thread, within limits of time and pixels.
 * @throws when it cannot be decoded within them
 */
export async function decodeHeic(bytes: Buffer, maxPixels: number): Promise<DecodedHeic> {
  // A Buffer may share its memory with others; the thread gets a copy it owns.
  const own = Uint8Array.from(bytes);
  const answer = await runInThread({
    beside: import.meta.url,
    name: 'decode-heic',
    input: { bytes: own, maxPixels },
    transfer: [own.buffer],
    limitMs: 30_000,
    memoryMb: 256,
  });
  return decoded.parse(answer);
}
