import fc from 'fast-check';
import { idempotencyHeader } from '#shared/contracts/headers.ts';
import { newId } from '#api/platform/ids.ts';
import { addUser, setSecondFactorRequired, signInStaff } from '#api/testing/people.ts';
import { orderForm } from '#api/testing/order-form.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { startTestApp } from '#api/testing/test-app.ts';
import { TestClock } from '#api/testing/test-clock.ts';
import { networks } from './networks.ts';
import { never, type Part } from './report.ts';

const bodies = 100_000;
const atOnce = 16;
const shownFaults = 10;

/** Any change to a JSON value somewhere inside it. */
function spoil(value: unknown, path: readonly number[], with_: unknown): unknown {
  const [step, ...rest] = path;
  if (step === undefined || typeof value !== 'object' || value === null) return with_;
  const keys = Object.keys(value);
  const key = keys[step % Math.max(1, keys.length)];
  if (key === undefined) return with_;
  const entries = Object.entries(value).map(([name, inside]): [string, unknown] => [
    name,
    name === key ? spoil(inside, rest, with_) : inside,
  ]);
  return Array.isArray(value) ? entries.map(([, inside]) => inside) : Object.fromEntries(entries);
}

/** What people's programs, people and their enemies send instead of an answer. */
const odd = fc.oneof(
  fc.jsonValue({ maxDepth: 2 }),
  fc.string({ unit: 'binary', maxLength: 60 }),
  fc.double(),
  fc.constantFrom<unknown>(
    undefined,
    '',
    '\u202eאבג',
    '👩🏽‍🍳'.repeat(40),
    '9'.repeat(400),
    -1,
    0,
    10_000,
    1e308,
    '2027-02-30',
    '0000-00-00',
    '__proto__',
    [],
    {},
  ),
);

/** A whole body with one to three places spoilt, or nothing like a body at all. */
function spoilt(whole: unknown): fc.Arbitrary<string> {
  const change = fc.tuple(fc.array(fc.nat(30), { minLength: 1, maxLength: 5 }), odd);
  return fc.oneof(
    {
      weight: 8,
      arbitrary: fc
        .array(change, { minLength: 1, maxLength: 3 })
        .map((changes) =>
          JSON.stringify(
            changes.reduce<unknown>((body, [path, with_]) => spoil(body, path, with_), whole),
          ),
        ),
    },
    { weight: 1, arbitrary: fc.json() },
    { weight: 1, arbitrary: fc.string({ unit: 'binary', maxLength: 200 }) },
  );
}

type Target = { readonly method: 'POST' | 'PUT'; readonly path: string; readonly whole: unknown };

function targets(): readonly { readonly weight: number; readonly target: Target }[] {
  const form = orderForm('2027-06-19');
  const { date, windowStart, ...guests } = form.day;
  const { cake, setting, look, extras } = form;
  const design = { guests, cake, setting, look, extras };
  const post = (weight: number, path: string, whole: unknown) => ({
    weight,
    target: { method: 'POST' as const, path, whole },
  });
  return [
    post(40, '/api/estimates', { design, date }),
    post(20, '/api/orders', { ...form, askWithoutDate: true }),
    post(10, '/api/dates', { design, from: '2027-06-01', to: '2027-06-30' }),
    post(4, '/api/session/password', { email: 'ida@example.com', password: 'a'.repeat(15) }),
    post(4, '/api/session/links', { email: 'ida@example.com', next: '/account' }),
    post(4, '/api/session/links/use', { token: 'A'.repeat(22) }),
    post(4, '/api/order-access', { code: 'AAAA-AAAA', key: 'A'.repeat(22) }),
    post(4, '/api/staff/orders/2401/confirm', { rowVersion: 1, note: 'Gladly.' }),
    post(4, '/api/staff/orders/2401/move', { rowVersion: 1, date, windowStart, note: '' }),
    post(2, '/api/staff/orders/2401/decline', { rowVersion: 1, reason: 'No', offerDates: true }),
    post(2, '/api/staff/orders/2401/messages', { body: 'Hello' }),
    post(2, '/api/staff/closures', { date: '2027-12-24', reason: 'Holiday' }),
  ];
}

export const fuzz: Part = {
  name: 'fuzz',
  about: `${bodies.toLocaleString('en')} spoilt bodies to ${targets().length} routes`,
  async run(note) {
    const app = await startTestApp({
      clock: new TestClock('2027-05-03T12:00:00Z'),
      seeded: seededStudio,
      env: () => ({ TRUST_PROXY: '127.0.0.1' }),
    });
    try {
      await setSecondFactorRequired(false);
      const baker = await signInStaff(app, await addUser('baker'));
      const request = fc.oneof(
        ...targets().map(({ weight, target }) => ({
          weight,
          arbitrary: spoilt(target.whole).map((body) => ({ ...target, body })),
        })),
      );
      const from = networks();
      const answered = new Map<number, number>();
      const faults: string[] = [];
      const requests = requestsOf(request);
      const sendAll = async () => {
        for (const { method, path, body } of requests) {
          const client = path.startsWith('/api/staff') ? baker : app.visitor();
          const { status } = await client.send(method, path, {
            body,
            headers: { [idempotencyHeader]: newId(), 'X-Forwarded-For': from() },
          });
          answered.set(status, (answered.get(status) ?? 0) + 1);
          if (status >= 500) faults.push(`${status} ${method} ${path} ${body}`);
        }
      };
      await Promise.all(Array.from({ length: atOnce }, sendAll));
      for (const [status, count] of [...answered].toSorted(([a], [b]) => a - b)) {
        note(`${status}: ${count.toLocaleString('en')}`);
      }
      for (const fault of faults.slice(0, shownFaults)) note(fault.slice(0, 400));
      return [never(`${bodies.toLocaleString('en')} spoilt bodies: a 5xx`, faults.length)];
    } finally {
      await app.close();
    }
  },
};

/** So many values, made as they are asked for; another run makes others. */
function* requestsOf<T>(arbitrary: fc.Arbitrary<T>): Generator<T, void> {
  const perSample = 200;
  for (let made = 0; made < bodies; made += perSample) {
    yield* fc.sample(arbitrary, Math.min(perSample, bodies - made));
  }
}
