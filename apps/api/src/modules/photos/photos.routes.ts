import type { Request, Response } from 'express';
import * as z from 'zod/mini';
import { done, itIsDone, line } from '#shared/contracts/common.ts';
import { photo, uploadedPhoto } from '#shared/contracts/photos.ts';
import { photoKind } from '#shared/contracts/vocabulary.ts';
import type { Photo } from '#api/db/models/photo.ts';
import { Order } from '#api/db/models/order.ts';
import { limitByAddress } from '#api/http/rate-limit.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import { receiveUpload, useUpload } from '#api/http/upload.ts';
import { validate } from '#api/http/validate.ts';
import { authorise, reveal } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { mayOrderAs } from '#api/modules/orders/may-order.queries.ts';
import { findOrderByCode, findOrderByNumber } from '#api/modules/orders/orders.queries.ts';
import { mayStaffDo } from '#api/modules/staff-orders/may-staff.queries.ts';
import type { Actor } from '#api/platform/actor.ts';
import { notFound } from '#api/platform/app-error.ts';
import { hashKey } from '#api/platform/ids.ts';
import { keepPhoto } from './keep-photo.command.ts';
import { readPhotoFile, uploadsDir } from './photo-files.ts';
import { findPhoto, presentPhoto } from './photos.queries.ts';
import { mayPhoto } from './photos.policy.ts';
import type { PhotoAction } from './photos.policy.ts';
import { removePhoto } from './remove-photo.command.ts';

const field = 'photo';
/** 25 MB: above what phones send of one picture, below what fills the disk in a morning. */
const maxBytes = 25 * 1024 ** 2;

/** Text fields of the form beside the file. */
const customersFields = z.object({
  kind: z._default(z.enum(['inspiration', 'print']), 'inspiration'),
  note: z._default(line(300), ''),
});
const staffFields = z.object({ kind: photoKind, note: z._default(line(300), '') });

const keyQuery = z.object({ key: z.optional(z.string().check(z.maxLength(100))) });
const photoId = z.string().check(z.maxLength(64));

/** Pictures: sent before the order exists and claimed by it, or added to one that does. */
export function photosRoutes(deps: Deps): FeatureRoutes {
  const routes = createRoutes();
  const folder = uploadsDir(deps.database.dataDir);
  const receive = [
    limitByAddress(deps, 'upload-photo'),
    receiveUpload({ field, folder, maxBytes }),
  ] as const;

  routes.add(
    {
      name: 'upload-photo',
      method: 'post',
      path: '/api/photos',
      summary: 'Send a picture before the order exists; answers the key that claims it.',
      upload: field,
      response: uploadedPhoto,
      status: 201,
      refusals: ['unreadable-photo', 'too-large', 'unavailable'],
    },
    async ({ actor, request }) => {
      const { kind, note } = validate(customersFields, { ...request.body });
      const kept = await useUpload(request, field, (file) =>
        keepPhoto(deps, { file, kind, note, actor, order: null }),
      );
      return { photo: presentPhoto(kept.photo), claimKey: kept.claimKey ?? '' };
    },
    ...receive,
  );

  routes.add(
    {
      name: 'add-order-photo',
      method: 'post',
      path: '/api/orders/:code/photos',
      summary: 'Add a picture to an order of one’s own.',
      params: z.object({ code: z.string().check(z.maxLength(20)) }),
      upload: field,
      response: photo,
      status: 201,
      refusals: ['not-found', 'unreadable-photo', 'too-large', 'too-many-photos', 'unavailable'],
    },
    async ({ actor, params, request }) => {
      const order = await findOrderByCode(params.code);
      reveal(mayOrderAs(actor, 'see', order));
      authorise(actor, mayOrderAs(actor, 'add-photos', order));
      const { kind, note } = validate(customersFields, { ...request.body });
      const { photo: kept } = await useUpload(request, field, (file) =>
        keepPhoto(deps, { file, kind, note, actor, order }),
      );
      return presentPhoto(kept);
    },
    ...receive,
  );

  routes.add(
    {
      name: 'add-staff-photo',
      method: 'post',
      path: '/api/staff/orders/:number/photos',
      summary: 'Add a picture of the finished cake, its handover or a fault.',
      params: z.object({ number: z.string().check(z.regex(/^\d{1,9}$/)) }),
      upload: field,
      response: photo,
      status: 201,
      refusals: ['not-found', 'unreadable-photo', 'too-large', 'too-many-photos', 'unavailable'],
    },
    async ({ actor, params, request }) => {
      authorise(actor, mayStaffDo(actor, 'add-photos'));
      const order = await findOrderByNumber(Number(params.number));
      const { kind, note } = validate(staffFields, { ...request.body });
      const { photo: kept } = await useUpload(request, field, (file) =>
        keepPhoto(deps, { file, kind, note, actor, order }),
      );
      return presentPhoto(kept);
    },
    ...receive,
  );

  routes.add(
    {
      name: 'see-photo',
      method: 'get',
      path: '/api/photos/:id/:width',
      summary:
        'A picture in a width, as WebP where that is accepted, else JPEG; `key` before it belongs to an order.',
      params: z.object({ id: photoId, width: z.string().check(z.regex(/^\d{1,5}$/)) }),
      query: keyQuery,
      produces: 'image/webp',
      refusals: ['not-found'],
    },
    async ({ actor, params, query, request, response }) => {
      const found = await findAllowed(actor, 'see', params.id, query.key);
      await sendPhoto(deps.database.dataDir, found, Number(params.width), request, response);
    },
  );

  routes.add(
    {
      name: 'remove-photo',
      method: 'delete',
      path: '/api/photos/:id',
      summary: 'Take back a picture that belongs to no order yet.',
      params: z.object({ id: photoId }),
      query: keyQuery,
      response: done,
      refusals: ['not-found'],
    },
    async ({ actor, params, query }) => {
      const { id } = await findAllowed(actor, 'remove', params.id, query.key);
      await removePhoto(deps, id);
      return itIsDone;
    },
  );
  return routes;
}

/** Somebody else's picture is no picture. */
async function findAllowed(
  actor: Actor,
  action: PhotoAction,
  id: string,
  key: string | undefined,
): Promise<Photo> {
  const found = await findPhoto(id);
  if (found === null) throw notFound();
  const order = found.orderId === null ? null : await Order.findByPk(found.orderId);
  const resource = {
    seesOrder: order === null ? null : mayOrderAs(actor, 'see', order),
    holdsKey: key !== undefined && found.claimKeyHash === hashKey(key),
  };
  reveal(mayPhoto(actor, action, resource));
  return found;
}

/** The smallest kept size that is wide enough, else the widest. */
async function sendPhoto(
  dataDir: string,
  found: Photo,
  width: number,
  request: Request,
  response: Response,
): Promise<void> {
  const takesWebp = (request.get('Accept') ?? '').includes('image/webp');
  const files = found.files
    .filter(({ format }) => (format === 'webp') === takesWebp)
    .toSorted((a, b) => a.width - b.width);
  const file = files.find((it) => it.width >= width) ?? files.at(-1);
  if (file === undefined) throw notFound();
  const bytes = await readPhotoFile(dataDir, found.id, file);
  response
    .set({
      // The bytes under an id never change; who may see them may, so no shared cache keeps them.
      'Cache-Control': 'private, max-age=86400',
      Vary: 'Accept',
      'Content-Security-Policy': "sandbox; default-src 'none'",
      'X-Content-Type-Options': 'nosniff',
      'Content-Disposition': 'inline',
    })
    .type(`image/${file.format}`)
    .send(bytes);
}
