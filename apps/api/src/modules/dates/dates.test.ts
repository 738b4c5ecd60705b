import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problem } from '#shared/contracts/common.ts';
import { datesResponse } from '#shared/contracts/dates.ts';
import type { DatesResponse } from '#shared/contracts/dates.ts';
import type { Design } from '#shared/contracts/design.ts';
import { Audit } from '#api/db/models/audit.ts';
import { Order } from '#api/db/models/order.ts';
import { Studio } from '#api/db/models/studio.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { blockDay } from '#api/modules/plan/block-day.command.ts';
import { loadCalendarDays } from '#api/modules/plan/calendar-days.queries.ts';
import { openDay } from '#api/modules/plan/open-day.command.ts';
import { plannedTasksOf } from '#api/modules/plan/planned-tasks.queries.ts';
import { orderForm, placeOrder, roundTier } from '#api/testing/order-form.ts';
import { addUser } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp } from '#api/testing/test-app.ts';
import type { TestApp } from '#api/testing/test-app.ts';
import { TestClock } from '#api/testing/test-clock.ts';

let app: TestApp;

beforeAll(async () => {
  // Monday 14 June 2027, ten in the morning.
  app = await startTestApp({ clock: new TestClock('2027-06-14T14:00:00Z'), seeded: seededStudio });
  // All of these tests send from one network.
  await inTransaction(() => Studio.update({ holdsPerAddress: 100 }, { where: { id: 1 } }));
});
afterAll(() => app.close());

function design(changes: Partial<Design> = {}): Design {
  const { day, cake, setting, look } = orderForm('2027-06-26');
  const { date: _date, windowStart: _start, ...guests } = day;
  return { guests, cake, setting, look, extras: [], ...changes };
}

async function ask(of: Design, from: string, to = from): Promise<DatesResponse> {
  const answer = await app.visitor().post('/api/dates', { design: of, from, to });
  expect(answer.status).toBe(200);
  return datesResponse.parse(answer.body);
}

describe('POST /api/dates', () => {
  it('answers every day of a range with its windows, its fill and why not', async () => {
    const { likely, days, firstOpen } = await ask(design(), '2027-06-13', '2027-07-06');
    expect(likely).toBe(false);
    const of = (date: string) => days.find((it) => it.date === date);
    expect(days).toHaveLength(24);
    // Four days' notice for a tiered cake: Friday is the first.
    expect(of('2027-06-13')?.reason).toMatchObject({ code: 'too-soon', earliest: '2027-06-18' });
    expect(of('2027-06-17')?.reason?.code).toBe('too-soon');
    expect(of('2027-06-18')).toMatchObject({ answer: 'open', reason: null, fill: 0 });
    expect(firstOpen).toBe('2027-06-18');
    expect(of('2027-06-20')).toMatchObject({
      answer: 'closed',
      reason: { code: 'closed-day', sentence: 'No pickups on Sunday 20 June.' },
    });
    expect(of('2027-06-19')?.windows.map((it) => it.start)).toEqual([
      600, 630, 660, 690, 930, 960, 990, 1020,
    ]);
    expect(of('2027-07-06')?.answer).toBe('open');
  });

  it('tells the bench’s fill and no order’s number', async () => {
    const { number } = await placeOrder(
      app.visitor(),
      orderForm('2027-06-30', { you: { email: 'number@example.com' } }),
    );
    const answer = await app
      .visitor()
      .post('/api/dates', { design: design(), from: '2027-06-29', to: '2027-06-30' });
    expect(answer.text).not.toContain(String(number));
    const { days } = datesResponse.parse(answer.body);
    expect(Math.max(...days.map((it) => it.fill))).toBeGreaterThan(0);
  });

  it('is likely before there is a design, by a cautious cake for the head count', async () => {
    const early = { cake: null, setting: null, look: null };
    const birthday = await ask(design(early), '2027-06-22', '2027-06-26');
    expect(birthday.likely).toBe(true);
    expect(birthday.days.map((it) => it.answer)).toEqual(['open', 'open', 'open', 'open', 'open']);
    const many = { ...design().guests, headCount: 1800, occasionId: 'wedding' };
    expect((await ask({ ...design(early), guests: many }, '2027-07-22', '2027-07-24')).likely).toBe(
      true,
    );
    const half = { ...design(), look: null };
    expect((await ask(half, '2027-06-22')).likely).toBe(true);
  });

  it('asks for the notice of the occasion and the decorations', async () => {
    const wedding = { ...design().guests, occasionId: 'wedding' };
    expect((await ask(design({ guests: wedding }), '2027-06-22')).days[0]?.reason).toMatchObject({
      code: 'too-soon',
      earliest: '2027-06-29',
    });
    const look = {
      palette: [],
      words: [],
      note: '',
      decorations: [
        {
          decorationId: 'figure',
          tier: null,
          quantity: 1,
          colour: null,
          source: 'studio' as const,
        },
      ],
    };
    expect((await ask(design({ look }), '2027-06-23')).days[0]?.reason).toMatchObject({
      code: 'too-soon',
      earliest: '2027-06-24',
    });
  });

  it('takes two weddings on a Saturday and no third', async () => {
    const wedding = { occasionId: 'wedding' };
    const saturday = '2027-07-24';
    const guests = { ...design().guests, ...wedding };
    expect((await ask(design({ guests }), saturday)).days[0]?.answer).toBe('open');
    await placeOrder(
      app.visitor(),
      orderForm(saturday, { day: wedding, you: { email: 'one@example.com' } }),
    );
    expect((await ask(design({ guests }), saturday)).days[0]?.answer).toBe('last-place');
    await placeOrder(
      app.visitor(),
      orderForm(saturday, { day: wedding, you: { email: 'two@example.com' } }),
    );
    const { days, firstOpen } = await ask(design({ guests }), saturday);
    expect(days[0]).toMatchObject({ answer: 'closed', reason: { code: 'full' } });
    expect(firstOpen).toBe('2027-07-27');
    expect((await ask(design(), saturday)).days[0]?.answer).not.toBe('closed');
  });

  it('closes a day the studio blocks, names the orders that stand, and opens it again', async () => {
    const day = '2027-07-28';
    const { code, number } = await placeOrder(
      app.visitor(),
      orderForm(day, { you: { email: 'block@example.com' } }),
    );
    const { id: userId, name } = await addUser('baker');
    const actor = { kind: 'staff', role: 'baker', userId, name, email: '' } as const;
    const block = await blockDay({ date: day, reason: 'The oven is serviced', actor });
    expect(block.standing).toEqual([number]);
    await expect(blockDay({ date: day, reason: 'again', actor })).rejects.toMatchObject({
      code: 'wrong-state',
    });
    const closed = (await ask(design(), day)).days[0];
    expect(closed).toMatchObject({ answer: 'closed', reason: { code: 'closed-day' } });
    // The reason is for the team.
    expect(JSON.stringify(closed)).not.toContain('oven');
    const order = await Order.findOne({ where: { code }, rejectOnEmpty: true });
    expect((await plannedTasksOf([order.id])).get(order.id)?.length).toBeGreaterThan(4);
    const [shown] = await loadCalendarDays(day, day);
    expect(shown).toMatchObject({
      closed: { id: block.id, reason: 'The oven is serviced' },
      benchMinutes: 0,
      pickups: 1,
    });
    await openDay({ id: block.id, actor });
    await expect(openDay({ id: block.id, actor })).rejects.toMatchObject({ code: 'not-found' });
    const noted = await Audit.findAll({ where: { subjectId: block.id }, order: [['at', 'ASC']] });
    expect(noted.map((it) => [it.action, it.actorUserId])).toEqual([
      ['block-day', userId],
      ['open-day', userId],
    ]);
    expect((await ask(design(), day)).days[0]?.answer).toBe('open');
  });

  it('shows the staff what fills a day, largest first', async () => {
    const day = '2027-08-18';
    const { number } = await placeOrder(
      app.visitor(),
      orderForm(day, {
        cake: { tiers: [roundTier(10), roundTier(8)] },
        you: { email: 'why@example.com' },
      }),
    );
    const days = await loadCalendarDays('2027-08-16', day);
    const busiest = days.toSorted((a, b) => b.plannedMinutes - a.plannedMinutes)[0];
    expect(busiest).toMatchObject({ closed: null, benchMinutes: 720 });
    expect(busiest?.why[0]).toMatch(
      new RegExp(`^No\\. ${number} [a-z ]+ (\\d h( \\d\\d)?|\\d+ min)$`),
    );
    expect(busiest?.shifts).toHaveLength(2);
    const [sunday] = await loadCalendarDays('2027-08-22', '2027-08-22');
    expect(sunday).toMatchObject({ closed: { id: null }, benchMinutes: 0, pickups: 0 });
  });

  it('answers far ahead and refuses what it cannot read', async () => {
    expect(
      (await ask(design(), '2031-01-01', '2031-01-02')).days.map((it) => it.reason?.code),
    ).toEqual(['too-far', 'too-far']);
    expect((await ask(design(), '9999-12-31')).days[0]?.reason?.code).toBe('too-far');
    const visitor = app.visitor();
    const send = (body: unknown) => visitor.post('/api/dates', body);
    const refusals = await Promise.all([
      send({ design: design(), from: '2027-06-31', to: '2027-07-01' }),
      send({ design: design(), from: '2027-07-02', to: '2027-07-01' }),
      send({ design: design(), from: '2027-07-02', to: '2029-07-01' }),
      send({
        design: design({
          cake: {
            kind: 'tiered',
            tiers: [roundTier(8, { spongeId: 'mud' })],
            sheet: null,
            coating: design().cake?.coating ?? null,
            cuttingCakes: [],
          },
        }),
        from: '2027-07-02',
        to: '2027-07-02',
      }),
      send({}),
    ]);
    expect(refusals.map((it) => it.status)).toEqual([422, 422, 422, 422, 422]);
    expect(problem.parse(refusals[3]?.body).issues?.[0]?.path).toEqual([
      'design',
      'cake',
      'tiers',
      0,
      'spongeId',
    ]);
  });
});
