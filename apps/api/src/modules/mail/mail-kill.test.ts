import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { fileURLToPath } from 'node:url';
import { setTimeout as pause } from 'node:timers/promises';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { groupBy } from '#shared/group-by.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { issueLink } from '#api/modules/sessions/issue-link.command.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import { readEnv } from '#api/platform/env.ts';
import { openTestDatabase } from '#api/testing/fresh-database.ts';
import type { TestDatabase } from '#api/testing/fresh-database.ts';
import { seededStudio } from '#api/testing/studio.ts';
import { smtpControl } from '#fakes/smtp/control.ts';
import { start } from '#fakes/smtp/start.ts';
import type { SmtpFake } from '#fakes/smtp/start.ts';

const kills = 10;
/** Mails that arrive between one kill and the next; the first is what the last kill cut short. */
const between = 2;
const total = kills * between + 4;

const program = fileURLToPath(new URL('../../testing/send-mail.process.ts', import.meta.url));
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
  const { clock, dataDir } = test;
  const env = readEnv({}, 'test');
  for (let n = 0; n < total; n += 1) {
    await inTransaction(async () => {
      const email = `n${n}@example.com`;
      const invitation = { purpose: 'invitation', email, role: 'baker' } as const;
      const { id: tokenId } = await issueLink({ clock, env }, invitation);
      await enqueue('staff-invited', { tokenId }, { uniqueKey: `staff-invited:${tokenId}` });
    });
  }
  const mailbox = smtpControl(fake.url);
  const arrived = async (): Promise<number> =>
    (await mailbox.calls()).filter(({ step }) => step === 'message').length;

  for (let kill = 0; kill <= kills; kill += 1) {
    // Every yes takes a while, so that there is a middle to be killed in.
    await mailbox.failNext({ kind: 'slow', ms: 20 }, between + 1);
    const target = kill === kills ? null : (await arrived()) + between;
    const args = ['--import', 'tsx', program, dataDir, fake.smtpUrl, clock.now().toISOString()];
    const child = spawn(process.execPath, args, { stdio: 'inherit' });
    const ended = once(child, 'exit');
    const enough = async (): Promise<boolean> =>
      target === null
        ? (await SentMail.count({ where: { state: 'sent' } })) === total
        : (await arrived()) >= target;
    while (child.exitCode === null && !(await enough())) await pause(4);
    // Each time a little later: before the server's yes, at it, after our note of it.
    await pause(kill * 3);
    child.kill('SIGKILL');
    await ended;
    // The dead worker's leases run out.
    clock.advance({ minutes: 3 });
  }

  expect(await OutboxRow.count({ where: { state: 'done' } })).toBe(total);
  const messages = await mailbox.messages();
  const byAddress = groupBy(messages, ({ to }) => to.join());
  expect(byAddress.size).toBe(total);
  expect(messages.length - total).toBeLessThanOrEqual(kills);
  for (const copies of byAddress.values()) {
    expect(copies.length).toBeLessThanOrEqual(2);
    const raw = await Promise.all(copies.map(({ id }) => mailbox.raw(id)));
    expect(new Set(raw).size).toBe(1);
  }
}, 300_000);
