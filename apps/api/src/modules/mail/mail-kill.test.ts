import { afterAll, beforeAll, expect, it } from 'vitest';
import { openTestDatabase } from '#api/testing/fresh-database.ts';
import type { TestDatabase } from '#api/testing/fresh-database.ts';
import { killSenders } from '#api/testing/kill-senders.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { smtpControl } from '#fakes/smtp/control.ts';
import { start } from '#fakes/smtp/start.ts';
import type { SmtpFake } from '#fakes/smtp/start.ts';

const kills = 10;
let test: TestDatabase;
let fake: SmtpFake;

beforeAll(async () => {
  test = await openTestDatabase({ seeded: seededStudio });
  fake = await start({ port: 0, smtpPort: 0 });
});
afterAll(async () => {
  await fake.stop();
  await test.close();
});

it(`loses no mail to ${kills} kills in the middle of sending, and doubles one at most once`, async () => {
  const { smtpUrl, url } = fake;
  const { total, done, copies } = await killSenders(test, {
    mailbox: smtpControl(url),
    smtpUrl,
    kills,
  });
  expect(done).toBe(total);
  expect(copies.size).toBe(total);
  const doubled = [...copies.values()].filter(({ length }) => length > 1);
  expect(doubled.length).toBeLessThanOrEqual(kills);
  for (const same of doubled) {
    expect(same).toHaveLength(2);
    expect(new Set(same).size).toBe(1);
  }
}, 300_000);
