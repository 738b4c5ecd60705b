import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { gunzipSync } from 'node:zlib';
import { problem } from '#shared/contracts/common.ts';
import { estimate } from '#shared/contracts/estimates.ts';
import { menu as menuContract } from '#shared/contracts/menu.ts';
import { today } from '#shared/dates/local-time.ts';
import { evaluateDesign } from '#shared/kitchen/evaluate-design.ts';
import { PriceBookVersion } from '#api/db/models/price-book-version.ts';
import { noteCatalogueChange } from '#api/db/plan-versions.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { freshMenu, preparedMenu } from '#api/modules/menu/menu.queries.ts';
import { orderForm } from '#api/testing/order-form.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp } from '#api/testing/test-app.ts';
import type { TestApp } from '#api/testing/test-app.ts';
import { TestClock } from '#api/testing/test-clock.ts';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp({ clock: new TestClock('2027-05-03T12:00:00Z'), seeded: seededStudio });
});
afterAll(() => app.close());

const { day, cake, setting, look, extras } = orderForm('2027-06-12');
const { date, windowStart: _start, ...guests } = day;
const design = { guests, cake, setting, look, extras };

describe('GET /api/menu', () => {
  it('is one prepared answer, asked again only for its tag', async () => {
    const first = await app
      .visitor()
      .get('/api/menu', { headers: { 'Accept-Encoding': 'identity' } });
    expect(first.status).toBe(200);
    const menu = menuContract.parse(first.body);
    const etag = first.headers.get('ETag') ?? '';
    expect(first.headers.get('Set-Cookie')).toBeNull();
    const again = await app.visitor().get('/api/menu', { headers: { 'If-None-Match': etag } });
    expect([again.status, again.text]).toEqual([304, '']);
    expect(menu.studio.name).toBe('Oxbow Lane Cake Studio');
  });

  it('is sent packed to whoever reads that', async () => {
    const prepared = await preparedMenu();
    const packed = await app.visitor().get('/api/menu', { headers: { 'Accept-Encoding': 'gzip' } });
    expect(packed.headers.get('Content-Encoding')).toBe('gzip');
    expect(JSON.parse(gunzipSync(prepared.gzip).toString())).toEqual(packed.body);
    expect(prepared.br.length).toBeLessThan(prepared.identity.length / 4);
  });

  it('follows a change of the catalogue', async () => {
    const before = await freshMenu();
    await inTransaction(async () => {
      const book = await PriceBookVersion.findOne({ rejectOnEmpty: true });
      await PriceBookVersion.create({
        n: 2,
        content: { ...book.content, wordsMinor: 999 },
        validFrom: app.clock.now(),
      });
      await noteCatalogueChange();
    });
    const after = await freshMenu();
    expect(after.priceBook.wordsMinor).toBe(999);
    expect(after.version).not.toBe(before.version);
  });
});

describe('POST /api/estimates', () => {
  it('answers what the same rules answer in the browser', async () => {
    const answer = await app.visitor().post('/api/estimates', { design, date });
    expect(answer.status).toBe(200);
    const menu = await freshMenu();
    const expected = evaluateDesign(
      { design, date },
      menu,
      today(app.clock.now(), menu.studio.zone),
    );
    expect(estimate.parse(answer.body)).toEqual(
      estimate.parse(JSON.parse(JSON.stringify(expected))),
    );
  });

  it('answers a design that is not finished', async () => {
    const body = {
      design: { guests, cake: null, setting: null, look: null, extras: [] },
      date: null,
    };
    const answer = await app.visitor().post('/api/estimates', body);
    expect(answer.status).toBe(200);
    expect(estimate.parse(answer.body).proposals.length).toBeGreaterThan(1);
  });

  it('refuses what the menu does not have, at its field', async () => {
    const unknown = { ...design, extras: [{ extraId: 'pony', quantity: 1 }] };
    const answer = await app.visitor().post('/api/estimates', { design: unknown, date });
    expect(answer.status).toBe(422);
    expect(problem.parse(answer.body).issues?.[0]?.path).toEqual([
      'design',
      'extras',
      0,
      'extraId',
    ]);
    expect((await app.visitor().post('/api/estimates', '{"design":')).status).toBe(400);
    expect((await app.visitor().post('/api/estimates', {})).status).toBe(422);
  });
});
