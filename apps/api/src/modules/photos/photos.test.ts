import { readdir } from 'node:fs/promises';
import net from 'node:net';
import path from 'node:path';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problem } from '#shared/contracts/common.ts';
import { guardHeader } from '#shared/contracts/headers.ts';
import { orderView } from '#shared/contracts/orders.ts';
import { photo as photoContract, uploadedPhoto } from '#shared/contracts/photos.ts';
import type { UploadedPhoto } from '#shared/contracts/photos.ts';
import { newId } from '#api/platform/ids.ts';
import { orderForm, placeOrder, sendOrder } from '#api/testing/order-form.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp } from '#api/testing/test-app.ts';
import type { TestApp } from '#api/testing/test-app.ts';
import type { Answer, TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';
import { removeStalePhotos } from './remove-stale-photos.command.ts';

let app: TestApp;
let jpeg: Buffer;
let days = 0;

beforeAll(async () => {
  app = await startTestApp({ clock: new TestClock('2027-05-03T12:00:00Z'), seeded: seededStudio });
  jpeg = await sharp({ create: { width: 1400, height: 900, channels: 3, background: '#b3263e' } })
    .jpeg()
    .toBuffer();
});
afterAll(() => app.close());

function form(bytes: Uint8Array | string, fields: Record<string, string> = {}): FormData {
  const body = new FormData();
  for (const [name, value] of Object.entries(fields)) body.set(name, value);
  body.set(
    'photo',
    new Blob([typeof bytes === 'string' ? bytes : Uint8Array.from(bytes)]),
    'cake.jpg',
  );
  return body;
}

async function upload(client: TestClient, bytes: Uint8Array = jpeg): Promise<UploadedPhoto> {
  const answer = await client.post('/api/photos', form(bytes));
  expect(answer.status, answer.text).toBe(201);
  return uploadedPhoto.parse(answer.body);
}

async function orderWith(photos: readonly UploadedPhoto[], client = app.visitor()) {
  days += 1;
  const date = `2027-06-${String(days + 1).padStart(2, '0')}`;
  const claims = photos.map(({ photo, claimKey }, index) => ({
    id: photo.id,
    claimKey,
    note: `picture ${index + 1}`,
  }));
  const you = { email: `${newId()}@example.com` };
  return { client, ...(await placeOrder(client, orderForm(date, { you, photos: claims }))) };
}

const codeOf = (answer: Answer) => problem.parse(answer.body).code;
const folders = () => readdir(path.join(app.deps.database.dataDir, 'photos'));
const uploads = () => readdir(path.join(app.deps.database.dataDir, 'uploads'));

describe('a photo before its order', () => {
  it('is kept in its widths, shown to whoever holds its key, and nothing is left of the upload', async () => {
    const client = app.visitor();
    const { photo, claimKey } = await upload(client);
    expect(photo).toMatchObject({
      kind: 'inspiration',
      width: 1400,
      height: 900,
      widths: [480, 1080, 1400],
    });
    const webp = await client.get(`/api/photos/${photo.id}/480?key=${claimKey}`, {
      headers: { Accept: 'image/avif,image/webp,*/*' },
    });
    expect(webp.status).toBe(200);
    expect(Object.fromEntries(webp.headers)).toMatchObject({
      'content-type': 'image/webp',
      'cache-control': 'private, max-age=86400',
      'x-content-type-options': 'nosniff',
      'content-security-policy': "sandbox; default-src 'none'",
      vary: 'Accept',
    });
    const fallback = await client.get(`/api/photos/${photo.id}/600?key=${claimKey}`);
    expect(fallback.headers.get('Content-Type')).toBe('image/jpeg');
    expect((await client.get(`/api/photos/${photo.id}/480`)).status).toBe(404);
    expect((await client.get(`/api/photos/${photo.id}/480?key=wrong`)).status).toBe(404);
    expect(await uploads()).toEqual([]);
  });

  it('is taken back by its key alone', async () => {
    const client = app.visitor();
    const { photo, claimKey } = await upload(client);
    expect((await client.delete(`/api/photos/${photo.id}?key=wrong`)).status).toBe(404);
    expect((await client.delete(`/api/photos/${photo.id}?key=${claimKey}`)).status).toBe(200);
    expect((await client.get(`/api/photos/${photo.id}/480?key=${claimKey}`)).status).toBe(404);
    expect(await folders()).not.toContain(photo.id);
  });

  it('goes after a day that no order claimed it', async () => {
    const claimed = await upload(app.visitor());
    await orderWith([claimed]);
    const lonely = await upload(app.visitor());
    expect(await removeStalePhotos(app.deps)).toBe(0);
    app.clock.advance({ hours: 25 });
    expect(await removeStalePhotos(app.deps)).toBeGreaterThanOrEqual(1);
    expect(await folders()).toContain(claimed.photo.id);
    expect(await folders()).not.toContain(lonely.photo.id);
  });
});

describe('a photo of an order', () => {
  it('is shown under the order’s policy, with its note, and claimed once', async () => {
    const client = app.visitor();
    const sent = [await upload(client), await upload(client)];
    const order = await orderWith(sent, client);
    const view = orderView.parse((await client.get(`/api/orders/${order.code}`)).body);
    expect(view.photos.map(({ note }) => note)).toEqual(['picture 1', 'picture 2']);
    const [first] = sent;
    const address = `/api/photos/${first?.photo.id}/480`;
    expect((await client.get(address)).status).toBe(200);
    // The key claimed it; it opens nothing any more.
    expect((await app.visitor().get(`${address}?key=${first?.claimKey}`)).status).toBe(404);
    expect(
      (await client.delete(`/api/photos/${first?.photo.id}?key=${first?.claimKey}`)).status,
    ).toBe(404);
    const again = await sendOrder(
      client,
      orderForm('2027-06-25', {
        photos: [{ id: first?.photo.id ?? '', claimKey: first?.claimKey ?? '', note: '' }],
      }),
    );
    expect(again.status).toBe(422);
  });

  it('is added later by its customer, eight at most, and by staff', async () => {
    const order = await orderWith([]);
    const add = (kind: string) =>
      order.client.post(
        `/api/orders/${order.code}/photos`,
        form(jpeg, { kind, note: 'like this' }),
      );
    expect(photoContract.parse((await add('print')).body)).toMatchObject({
      kind: 'print',
      note: 'like this',
    });
    expect((await add('handover')).status).toBe(422);
    for (let n = 1; n < 8; n += 1) expect((await add('inspiration')).status).toBe(201);
    const ninth = await add('inspiration');
    expect([ninth.status, codeOf(ninth)]).toEqual([422, 'too-many-photos']);
    expect((await app.visitor().post(`/api/orders/${order.code}/photos`, form(jpeg))).status).toBe(
      404,
    );

    await setSecondFactorRequired(false);
    const counter = await signInStaff(app, await addUser('counter'));
    const handover = `/api/staff/orders/${order.number}/photos`;
    expect((await counter.post(handover, form(jpeg, { kind: 'handover' }))).status).toBe(201);
    expect((await order.client.post(handover, form(jpeg, { kind: 'handover' }))).status).toBe(401);
  });
});

describe('what is no photo', () => {
  it('gets a clear no: text, an empty file, none, a form of something else', async () => {
    const client = app.visitor();
    const text = await client.post('/api/photos', form('dear baker'));
    expect([text.status, codeOf(text)]).toEqual([415, 'unreadable-photo']);
    expect((await client.post('/api/photos', form(''))).status).toBe(415);
    const none = await client.post('/api/photos', new FormData());
    expect([none.status, problem.parse(none.body).issues?.[0]?.path]).toEqual([422, ['photo']]);
    expect((await client.post('/api/photos', { photo: 'x' })).status).toBe(422);
    const wrongField = new FormData();
    wrongField.set('picture', new Blob([Uint8Array.from(jpeg)]), 'a.jpg');
    expect((await client.post('/api/photos', wrongField)).status).toBe(400);
    const cut = await client.post('/api/photos', form(jpeg.subarray(0, jpeg.length / 2)));
    expect([cut.status, codeOf(cut)]).toEqual([415, 'unreadable-photo']);
    expect(await uploads()).toEqual([]);
  });

  it('refuses 40 MB, saying how much is taken', async () => {
    const answer = await app.visitor().post('/api/photos', form(new Uint8Array(40 * 1024 ** 2)));
    expect([answer.status, codeOf(answer)]).toEqual([413, 'too-large']);
    expect(problem.parse(answer.body).detail).toContain('25 MB');
    expect(await uploads()).toEqual([]);
  });

  it('outlives an upload that breaks off on its way', async () => {
    const url = new URL(app.url);
    const head = [
      'POST /api/photos HTTP/1.1',
      `Host: ${url.host}`,
      `Origin: ${url.origin}`,
      `${guardHeader}: 1`,
      'Content-Type: multipart/form-data; boundary=x',
      'Content-Length: 90000',
      '',
      '--x\r\nContent-Disposition: form-data; name="photo"; filename="a.jpg"\r\n\r\nabc',
    ].join('\r\n');
    await new Promise<void>((resolve, reject) => {
      const socket = net.connect(Number(url.port), url.hostname, () => {
        socket.write(head, () => setImmediate(() => socket.destroy()));
      });
      socket.once('close', () => resolve());
      socket.once('error', reject);
    });
    expect((await app.visitor().get('/api/health')).status).toBe(200);
  });
});
