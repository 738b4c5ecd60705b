import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import * as z from 'zod/mini';
import { staffPeople, type StaffPeople } from '#shared/contracts/accounts.ts';
import { Audit } from '#api/db/models/audit.ts';
import { User } from '#api/db/models/user.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import {
  addUser,
  lastLinkKey,
  setSecondFactorRequired,
  signInCustomer,
  signInStaff,
} from '#api/testing/people.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp, type TestApp } from '#api/testing/test-app.ts';
import type { Answer, TestClient } from '#api/testing/test-client.ts';
import { offerFirstOwner } from './offer-first-owner.command.ts';

const password = 'plum jam on rye toast';
let app: TestApp;

beforeAll(async () => {
  app = await startTestApp({ seeded: seededStudio });
  await setSecondFactorRequired(false);
});
afterAll(() => app.close());

const accept = (token: string, more: object = {}, client = app.visitor()) =>
  client.post('/api/session/invitations/use', { token, name: 'Maren Holt', password, ...more });
const people = (answer: Answer): StaffPeople['people'] => z.parse(staffPeople, answer.body).people;

describe('the first owner', () => {
  it('is made by the printed link, once, with an address of their own', async () => {
    const [older = '', newer = ''] = [
      await offerFirstOwner(app.deps),
      await offerFirstOwner(app.deps),
    ].map((address) => address?.split('#')[1]);
    expect((await accept(older)).status).toBe(410);
    const look = await app.visitor().post('/api/session/links/look', { token: newer });
    expect(look.body).toEqual({ purpose: 'first-owner', email: null, role: 'owner', name: null });
    expect((await accept(newer)).body).toMatchObject({ issues: [{ path: ['email'] }] });
    const client = app.visitor();
    const answer = await accept(newer, { email: 'maren@oxbowlane.example' }, client);
    expect(answer.body).toMatchObject({
      user: { role: 'owner', email: 'maren@oxbowlane.example' },
    });
    expect((await client.get('/api/staff/people')).status).toBe(200);
    expect((await accept(newer, { email: 'second@oxbowlane.example' })).status).toBe(410);
    expect(await offerFirstOwner(app.deps)).toBeNull();
  });
});

describe('inviting staff', () => {
  let owner: TestClient;
  beforeAll(async () => {
    owner = await signInStaff(app, await addUser('owner', { email: 'owner@oxbowlane.example' }));
  });

  const invite = (email: string, role = 'baker') =>
    owner.post('/api/staff/people/invitations', { email, name: 'Ines Castellan', role });
  const keyFor = (email: string) => lastLinkKey(app, 'invitation', email);

  it('sends a link by e-mail that makes the account, its address proven', async () => {
    const invited = people(await invite('ines@oxbowlane.example'));
    expect(invited).toContainEqual(
      expect.objectContaining({ email: 'ines@oxbowlane.example', state: 'invited', role: 'baker' }),
    );
    expect(await OutboxRow.count({ where: { kind: 'staff-invited' } })).toBe(1);
    const client = app.visitor();
    const answer = await accept(await keyFor('ines@oxbowlane.example'), { name: 'Ines' }, client);
    expect(answer.body).toMatchObject({ user: { name: 'Ines', role: 'baker' } });
    const user = await User.findOne({ where: { email: 'ines@oxbowlane.example' } });
    expect(user?.emailProvenAt).toEqual(app.clock.now());
    expect(
      await Audit.count({ where: { action: 'accept-invitation', subjectId: user?.id ?? '' } }),
    ).toBe(1);
  });

  it('is refused for somebody who works here', async () => {
    expect((await invite('owner@oxbowlane.example')).body).toMatchObject({
      code: 'invalid-input',
      issues: [{ path: ['email'] }],
    });
  });

  it('sent again, replaces the link before', async () => {
    const [first] = people(await invite('again@oxbowlane.example')).filter(
      ({ email }) => email === 'again@oxbowlane.example',
    );
    const before = await keyFor('again@oxbowlane.example');
    app.clock.advance({ minutes: 1 });
    const again = await owner.post(`/api/staff/people/${first?.id ?? ''}/invitation`);
    expect(people(again).filter(({ email }) => email === 'again@oxbowlane.example')).toHaveLength(
      1,
    );
    expect((await accept(before)).status).toBe(410);
    expect((await accept(await keyFor('again@oxbowlane.example'))).status).toBe(200);
  });

  it('can be withdrawn, and runs out after seven days', async () => {
    const listed = people(await invite('withdrawn@oxbowlane.example'));
    const id = listed.find(({ email }) => email === 'withdrawn@oxbowlane.example')?.id ?? '';
    expect(
      people(await owner.delete(`/api/staff/people/${id}`)).some((each) => each.id === id),
    ).toBe(false);
    expect((await accept(await keyFor('withdrawn@oxbowlane.example'))).status).toBe(410);

    await invite('late@oxbowlane.example');
    const key = await keyFor('late@oxbowlane.example');
    const back = app.clock.now();
    app.clock.advance({ days: 7 });
    expect((await accept(key)).status).toBe(410);
    app.clock.set(back);
  });

  it('takes a customer’s account over without the ways in it had', async () => {
    const customer = await signInCustomer(app, 'rosa@example.com');
    await invite('rosa@example.com', 'counter');
    await accept(await keyFor('rosa@example.com'), { name: 'Rosa' });
    expect((await customer.get('/api/session')).body).toMatchObject({ user: null });
    await app.visitor().post('/api/session/links', { email: 'rosa@example.com' });
    const link = await lastLinkKey(app, 'sign-in', 'rosa@example.com');
    expect((await app.visitor().post('/api/session/links/use', { token: link })).status).toBe(410);
  });
});

describe('ending and changing roles', () => {
  it('ends every session at once, and the ways in', async () => {
    const owner = await addUser('owner', { email: 'owner.two@oxbowlane.example' });
    const baker = await addUser('baker', { email: 'going@oxbowlane.example' });
    const [asOwner, asBaker] = [await signInStaff(app, owner), await signInStaff(app, baker)];
    const ended = people(await asOwner.delete(`/api/staff/people/${baker.id}`));
    expect(ended.find(({ id }) => id === baker.id)).toMatchObject({
      state: 'ended',
      can: { end: false, changeRole: false },
    });
    expect((await asBaker.get('/api/account/sessions')).status).toBe(401);
    await expect(signInStaff(app, baker)).rejects.toThrow('could not sign in');
    // Later they may come as a customer, by a link, like anybody.
    const later = await signInCustomer(app, 'going@oxbowlane.example');
    expect((await later.get('/api/session')).body).toMatchObject({ user: { role: 'customer' } });
    expect((await later.get('/api/staff/people')).status).toBe(403);
  });

  it('asks for signing in again with the new role', async () => {
    const owner = await addUser('owner', { email: 'owner.three@oxbowlane.example' });
    const counter = await addUser('counter', { email: 'up@oxbowlane.example' });
    const [asOwner, before] = [await signInStaff(app, owner), await signInStaff(app, counter)];
    await asOwner.put(`/api/staff/people/${counter.id}/role`, { role: 'baker' });
    expect((await before.get('/api/account/sessions')).status).toBe(401);
    const after = await signInStaff(app, counter);
    expect((await after.get('/api/session')).body).toMatchObject({ user: { role: 'baker' } });
  });

  it('is not done to oneself: an owner always remains', async () => {
    const owner = await addUser('owner', { email: 'owner.four@oxbowlane.example' });
    const client = await signInStaff(app, owner);
    expect((await client.delete(`/api/staff/people/${owner.id}`)).status).toBe(403);
    expect((await client.put(`/api/staff/people/${owner.id}/role`, { role: 'baker' })).status).toBe(
      403,
    );
  });
});
