import { parentPort, workerData } from 'node:worker_threads';
import * as z from 'zod/mini';
import libheif from 'libheif-js/wasm-bundle.js';

/** Decodes one HEIC picture to RGBA; run by `decodeHeic`, once, in a thread of its own. */
const { bytes, maxPixels } = z
  .object({ bytes: z.instanceof(Uint8Array), maxPixels: z.int() })
  .parse(workerData);

const images = new libheif.HeifDecoder().decode(bytes);
const image = images.find((it) => it.is_primary()) ?? images[0];
if (image === undefined) throw new Error('No picture in this file.');
const width = image.get_width();
const height = image.get_height();
if (width * height > maxPixels) throw new Error('Too many pixels.');
const pixels = new Uint8ClampedArray(width * height * 4);
image.display({ data: pixels, width, height }, (shown) => {
  // A throw here would be outside everything: the answer without a picture says it failed.
  parentPort?.postMessage(
    shown === null ? null : { width, height, pixels },
    shown === null ? [] : [pixels.buffer],
  );
});
