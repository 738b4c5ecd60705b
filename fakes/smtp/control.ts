import { setTimeout as pause } from 'node:timers/promises';
import * as z from 'zod/mini';
import { read, readText, tell } from '#fakes/harness/control-request.ts';
import type { MailMessage, MessageFilter, SmtpCall, SmtpFailure } from './wire.ts';
import { mailMessage, smtpCall } from './wire.ts';

/** How often a waiting client looks again. */
const lookAgainMs = 100;

export interface SmtpControl {
  /** Messages that fit, oldest first. */
  messages(filter?: MessageFilter): Promise<MailMessage[]>;
  /** The newest message that fits, as soon as there is one; throws after `timeoutMs` (15 s). */
  waitForMessage(filter: MessageFilter, timeoutMs?: number): Promise<MailMessage>;
  /** The bytes of a message as they arrived, read as UTF-8. */
  raw(id: string): Promise<string>;
  /** An attachment's content, read as UTF-8; counted from 0. */
  attachment(id: string, index: number): Promise<string>;
  /** Empties the mailbox. */
  clear(): Promise<void>;
  /** Lets the next `times` attempts fail in this way (1 unless said). */
  failNext(failure: SmtpFailure, times?: number): Promise<void>;
  clearFailures(): Promise<void>;
  /** Every attempt so far, or since the given instant. */
  calls(since?: Date): Promise<SmtpCall[]>;
}

/** The control client of a running mailbox, for tests; `url` as its `start` gave it. */
export function smtpControl(url: string): SmtpControl {
  const messages = (filter: MessageFilter = {}) => {
    const given = Object.entries(filter).filter(([, value]) => value !== undefined);
    const query = new URLSearchParams(Object.fromEntries(given)).toString();
    return read(`${url}/api/messages?${query}`, z.array(mailMessage));
  };

  return {
    messages,
    async waitForMessage(filter, timeoutMs = 15_000) {
      for (let waited = 0; waited <= timeoutMs; waited += lookAgainMs) {
        const newest = (await messages(filter)).at(-1);
        if (newest !== undefined) return newest;
        await pause(lookAgainMs);
      }
      const subjects = (await messages()).map(({ to, subject }) => `${to.join(', ')}: ${subject}`);
      throw new Error(
        `No message fits ${JSON.stringify(filter)}. There are:\n${subjects.join('\n')}`,
      );
    },
    raw: (id) => readText(`${url}/messages/${id}/raw`),
    attachment: (id, index) => readText(`${url}/messages/${id}/attachments/${index}`),
    clear: () => tell(`${url}/api/messages`, 'DELETE'),
    failNext: (failure, times = 1) => tell(`${url}/api/failures`, 'POST', { failure, times }),
    clearFailures: () => tell(`${url}/api/failures`, 'DELETE'),
    calls: (since) => {
      const query = since === undefined ? '' : `?since=${since.toISOString()}`;
      return read(`${url}/api/calls${query}`, z.array(smtpCall));
    },
  };
}
