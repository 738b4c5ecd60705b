import { spawn } from 'node:child_process';
import { once } from 'node:events';
import path from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';
import { groupBy } from '#shared/group-by.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { issueLink } from '#api/modules/sessions/issue-link.command.ts';
import { enqueue } from '#api/outbox/enqueue.ts';
import { readEnv } from '#api/platform/env.ts';
import type { SmtpControl } from '#fakes/smtp/control.ts';
import type { TestDatabase } from './fresh-database.ts';

/** Mails that arrive between one kill and the next; the first is what the last kill cut short. */
const between = 2;

/** Different moments of dying, so that many kills do not make ever longer pauses. */
const moments = 12;

const program = path.join(import.meta.dirname, 'send-mail.process.ts');

export type AfterKills = {
  /** Mails that were to be sent, each to an address of its own. */
  readonly total: number;
  /** Events that were carried out to the end. */
  readonly done: number;
  /** What came to each address, byte for byte. */
  readonly copies: ReadonlyMap<string, readonly string[]>;
};

/**
 * Queues mails and sends them by workers that are killed (-9) in the middle of sending, so many
 * times, each at another moment; the last is left to finish. The database needs a studio.
 */
export async function killSenders(
  { clock, dataDir }: TestDatabase,
  { mailbox, smtpUrl, kills }: { mailbox: SmtpControl; smtpUrl: string; kills: number },
): Promise<AfterKills> {
  const total = kills * between + 4;
  const env = readEnv({}, 'test');
  for (let n = 0; n < total; n += 1) {
    await inTransaction(async () => {
      const email = `n${n}@example.com`;
      const invitation = { purpose: 'invitation', email, role: 'baker' } as const;
      const { id: tokenId } = await issueLink({ clock, env }, invitation);
      await enqueue('staff-invited', { tokenId }, { uniqueKey: `staff-invited:${tokenId}` });
    });
  }
  const arrived = async (): Promise<number> =>
    (await mailbox.calls()).filter(({ step }) => step === 'message').length;

  for (let kill = 0; kill <= kills; kill += 1) {
    // Every yes takes a while, so that there is a middle to be killed in.
    await mailbox.failNext({ kind: 'slow', ms: 20 }, between + 1);
    const before = await arrived();
    const args = ['--import', 'tsx', program, dataDir, smtpUrl, clock.now().toISOString()];
    const child = spawn(process.execPath, args, { stdio: 'inherit' });
    const ended = once(child, 'exit');
    const enough = async (): Promise<boolean> =>
      kill === kills
        ? (await SentMail.count({ where: { state: 'sent' } })) === total
        : (await arrived()) >= before + between;
    while (!(await enough())) {
      if (child.exitCode !== null) throw new Error('A worker ended by itself.');
      await pause(4);
    }
    // Each time a little later: before the server's yes, at it, after our note of it.
    await pause((kill % moments) * 3);
    child.kill('SIGKILL');
    await ended;
    // The dead worker's leases run out.
    clock.advance({ minutes: 3 });
  }

  const messages = await mailbox.messages();
  const copies = new Map<string, readonly string[]>();
  for (const [address, sent] of groupBy(messages, ({ to }) => to.join())) {
    copies.set(address, await Promise.all(sent.map(({ id }) => mailbox.raw(id))));
  }
  return { total, done: await OutboxRow.count({ where: { state: 'done' } }), copies };
}
