import * as z from 'zod/mini';
import { colourHex, id, instant, line } from './common.ts';
import { photoKind } from './vocabulary.ts';

/** A picture as others see it; `url` and its sizes need the order's permission. */
export const photo = z.object({
  id,
  kind: photoKind,
  note: z.string(),
  width: z.int(),
  height: z.int(),
  palette: z.array(colourHex),
  /** Widths there are, smallest first; `GET /api/photos/:id/:width` answers AVIF, WebP or JPEG. */
  widths: z.array(z.int()),
  createdAt: instant,
});
export type Photo = z.infer<typeof photo>;

/** `POST /api/photos` (multipart, field `photo`): the id, and the key that attaches it. */
export const uploadedPhoto = z.object({ photo, claimKey: z.string() });
export type UploadedPhoto = z.infer<typeof uploadedPhoto>;

/** A photo named in an order that is being sent. */
export const photoClaim = z.object({
  id,
  claimKey: z.string().check(z.maxLength(100)),
  note: line(300),
});
export type PhotoClaim = z.infer<typeof photoClaim>;
