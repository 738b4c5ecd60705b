import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { problem } from '#shared/contracts/common.ts';
import { blockedDay, calendarView } from '#shared/contracts/staff.ts';
import type { CalendarView } from '#shared/contracts/staff.ts';
import { newId } from '#api/platform/ids.ts';
import { orderForm, placeOrder } from '#api/testing/order-form.ts';
import type { FormChanges } from '#api/testing/order-form.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp } from '#api/testing/test-app.ts';
import type { TestApp } from '#api/testing/test-app.ts';
import type { TestClient } from '#api/testing/test-client.ts';
import { TestClock } from '#api/testing/test-clock.ts';

let app: TestApp;
let baker: TestClient;
let counter: TestClient;

beforeAll(async () => {
  app = await startTestApp({ clock: new TestClock('2027-05-03T12:00:00Z'), seeded: seededStudio });
  await setSecondFactorRequired(false);
  baker = await signInStaff(app, await addUser('baker'));
  counter = await signInStaff(app, await addUser('counter'));
});
afterAll(() => app.close());

async function ask(date: string, changes: FormChanges = {}): Promise<number> {
  const you = { email: `${newId()}@example.com` };
  return (await placeOrder(app.visitor(), orderForm(date, { you, ...changes }))).number;
}

async function calendar(from: string, to: string, by = baker): Promise<CalendarView> {
  const answer = await by.get(`/api/staff/calendar?from=${from}&to=${to}`);
  expect(answer.status, answer.text).toBe(200);
  return calendarView.parse(answer.body);
}

describe('the staff’s calendar', () => {
  it('shows days with their load, a lane per promised cake, and what waits', async () => {
    const waiting = await ask('2027-05-21', {
      day: {
        allergies: [{ allergen: 'egg', species: null, text: '', severity: 'allergy', guests: 1 }],
      },
      consents: { allergyData: true },
    });
    const promised = await ask('2027-05-22');
    await baker.post(`/api/staff/orders/${promised}/confirm`, { rowVersion: 1 });

    const view = await calendar('2027-05-17', '2027-05-23');
    expect(view.today).toBe('2027-05-03');
    expect(view.days.map(({ date }) => date)).toHaveLength(7);
    expect(view.days.reduce((sum, day) => sum + day.plannedMinutes, 0)).toBeGreaterThan(0);
    expect(view.days.every((day) => day.plannedMinutes <= day.benchMinutes)).toBe(true);
    expect(view.lanes.map(({ number }) => number)).toEqual([promised]);
    expect(view.lanes[0]?.tasks.length).toBeGreaterThan(3);
    expect(view.waiting.map(({ number }) => number)).toEqual([waiting]);
    expect(view.waiting[0]).toMatchObject({
      advice: { code: 'allergen', level: 'stop' },
      fits: { fits: true },
      can: { confirm: false, decline: true },
    });
    expect((await calendar('2027-05-17', '2027-05-23', counter)).waiting[0]?.can).toEqual({
      confirm: false,
      decline: false,
    });
  });

  it('closes a day, names what stands on it, and opens it again', async () => {
    const number = await ask('2027-06-11');
    const blocked = blockedDay.parse(
      (await baker.post('/api/staff/closures', { date: '2027-06-11', reason: 'Stocktaking' })).body,
    );
    expect(blocked.standing).toContain(number);
    const day = (await calendar('2027-06-11', '2027-06-11')).days[0];
    expect(day?.closed).toEqual({ id: blocked.id, reason: 'Stocktaking' });
    const twice = await baker.post('/api/staff/closures', { date: '2027-06-11', reason: 'Again' });
    expect(problem.parse(twice.body).code).toBe('wrong-state');
    expect((await counter.delete(`/api/staff/closures/${blocked.id}`)).status).toBe(403);
    expect((await baker.delete(`/api/staff/closures/${blocked.id}`)).status).toBe(200);
    expect((await baker.delete(`/api/staff/closures/${blocked.id}`)).status).toBe(404);
    expect((await calendar('2027-06-11', '2027-06-11')).days[0]?.closed).toBeNull();
  });

  it('refuses a range that is backwards, too long or no range', async () => {
    for (const query of ['from=2027-06-02&to=2027-06-01', 'from=2027-01-01&to=2027-12-31', '']) {
      expect((await baker.get(`/api/staff/calendar?${query}`)).status).toBe(422);
    }
    expect(
      (await app.visitor().get('/api/staff/calendar?from=2027-06-01&to=2027-06-02')).status,
    ).toBe(401);
  });
});
