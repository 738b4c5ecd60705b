import { X509Certificate } from 'node:crypto';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { createConnection } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { SendMailOptions, SentMessageInfo } from 'nodemailer';
import nodemailer from 'nodemailer';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { SmtpControl } from './control.ts';
import { smtpControl } from './control.ts';
import type { SmtpFake } from './start.ts';
import { start } from './start.ts';

let folder: string;
let clock: Date;
let fake: SmtpFake;
let control: SmtpControl;

async function restart(options: { startTls?: boolean } = {}): Promise<void> {
  fake = await start({
    port: 0,
    smtpPort: 0,
    dataDir: folder,
    now: () => clock,
    ...options,
  });
  control = smtpControl(fake.url);
}

beforeEach(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'smtp-'));
  clock = new Date('2031-03-04T15:00:00Z');
  await restart();
});

afterEach(async () => {
  await fake.stop();
  await rm(folder, { recursive: true });
});

const mail: SendMailOptions = {
  from: 'Oxbow Lane <hello@oxbowlane.example>',
  to: 'rosa.whitlock@example.com',
  subject: 'Your order No. 2421',
  text: 'Follow it here: http://127.0.0.1:4100/o/AB12#key and <come> by.',
  html: '<!doctype html><html><head></head><body><a href="http://127.0.0.1:4100/">here</a></body></html>',
};

/** Sends with a client of another make; rejects as that client does. */
function send(changed: SendMailOptions = {}): Promise<SentMessageInfo> {
  return nodemailer.createTransport(fake.smtpUrl).sendMail({ ...mail, ...changed });
}

const get = (address: string): Promise<Response> => fetch(`${fake.url}${address}`);

describe('receiving', () => {
  it('takes a message apart', async () => {
    await send({
      messageId: '<second@oxbowlane.example>',
      inReplyTo: '<first@oxbowlane.example>',
      references: ['<first@oxbowlane.example>'],
      headers: { 'X-Folded': 'word '.repeat(30).trim() },
      attachments: [
        {
          filename: 'pickup.ics',
          content: 'BEGIN:VCALENDAR',
          contentType: 'text/calendar',
        },
      ],
    });
    const [message] = await control.messages();
    expect(message).toMatchObject({
      id: '1',
      receivedAt: '2031-03-04T15:00:00.000Z',
      sender: 'hello@oxbowlane.example',
      to: ['rosa.whitlock@example.com'],
      subject: 'Your order No. 2421',
      messageId: '<second@oxbowlane.example>',
      inReplyTo: '<first@oxbowlane.example>',
      references: ['<first@oxbowlane.example>'],
      attachments: [{ filename: 'pickup.ics', contentType: 'text/calendar', inline: false }],
    });
    expect(message?.text).toContain('Follow it here');
    expect(message?.headers).toContainEqual({
      name: 'X-Folded',
      value: 'word '.repeat(30).trim(),
    });
    expect(await control.raw('1')).toContain('Message-ID: <second@oxbowlane.example>');
    expect(await control.attachment('1', 0)).toBe('BEGIN:VCALENDAR');
  });

  it('finds messages by recipient, subject and time', async () => {
    await send();
    clock = new Date('2031-03-04T15:05:00Z');
    await send({ to: 'tomas.adair@example.com', subject: 'Your sign-in link' });
    const subjects = async (filter: Parameters<SmtpControl['messages']>[0]) =>
      (await control.messages(filter)).map(({ subject }) => subject);
    expect(await subjects({ to: 'Tomas.Adair@example.com' })).toEqual(['Your sign-in link']);
    expect(await subjects({ subject: 'no. 2421' })).toEqual(['Your order No. 2421']);
    expect(await subjects({ since: '2031-03-04T15:01:00.000Z' })).toEqual(['Your sign-in link']);
    expect(await subjects({ to: 'tomas.adair@example.com', subject: 'order' })).toEqual([]);
  });

  it('waits for a message, and says what there is when none comes', async () => {
    const waiting = control.waitForMessage({ subject: 'order' });
    await send();
    expect((await waiting).subject).toBe('Your order No. 2421');
    await expect(control.waitForMessage({ subject: 'ready' }, 0)).rejects.toThrow(
      'rosa.whitlock@example.com: Your order No. 2421',
    );
  });

  it('keeps messages and their numbers over a restart, until it is emptied', async () => {
    await send();
    await fake.stop();
    await restart();
    await send({ subject: 'Second' });
    const ids = (await control.messages()).map(({ id, subject }) => [id, subject]);
    expect(ids).toEqual([
      ['1', 'Your order No. 2421'],
      ['2', 'Second'],
    ]);
    await control.clear();
    await fake.stop();
    await restart();
    expect(await control.messages()).toEqual([]);
  });

  it('refuses a message over its size', async () => {
    await expect(send({ text: 'a'.repeat(11 * 1024 * 1024) })).rejects.toMatchObject({
      responseCode: 552,
    });
    expect(await control.messages()).toEqual([]);
  });
});

describe('failing on request', () => {
  it.each([
    [{ kind: 'refuse-connection', code: 421 } as const, 421, 'connect', 'deferred'],
    [{ kind: 'refuse-connection', code: 554 } as const, 554, 'connect', 'refused'],
    [{ kind: 'refuse', code: 550 } as const, 550, 'recipient', 'refused'],
    [{ kind: 'defer', code: 451 } as const, 451, 'recipient', 'deferred'],
  ])('%j', async (failure, responseCode, step, outcome) => {
    await control.failNext(failure, 2);
    await expect(send()).rejects.toMatchObject({ responseCode });
    await expect(send()).rejects.toMatchObject({ responseCode });
    await send();
    expect(await control.messages()).toHaveLength(1);
    const calls = await control.calls();
    expect(calls.map((call) => [call.step, call.outcome])).toEqual([
      [step, outcome],
      [step, outcome],
      ['message', 'accepted'],
    ]);
  });

  it('only for the recipient that is named', async () => {
    await control.failNext({
      kind: 'refuse',
      code: 550,
      recipient: 'TOMAS.adair@example.com',
    });
    await send();
    await expect(send({ to: 'tomas.adair@example.com' })).rejects.toMatchObject({
      responseCode: 550,
    });
  });

  it('cuts the line after the message, which is kept', async () => {
    await control.failNext({ kind: 'drop-after-data' });
    await expect(send({ messageId: '<same@oxbowlane.example>' })).rejects.toThrow();
    await send({ messageId: '<same@oxbowlane.example>' });
    const ids = (await control.messages()).map(({ messageId }) => messageId);
    expect(ids).toEqual(['<same@oxbowlane.example>', '<same@oxbowlane.example>']);
    const [dropped, accepted] = await control.calls();
    expect(dropped).toMatchObject({
      outcome: 'dropped',
      messageId: '<same@oxbowlane.example>',
    });
    expect(accepted).toMatchObject({ outcome: 'accepted', code: 250 });
  });

  it('answers late', async () => {
    await control.failNext({ kind: 'slow', ms: 20 });
    await send();
    expect(await control.messages()).toHaveLength(1);
  });

  it('stops failing when told to, and refuses to plan what it does not know', async () => {
    await control.failNext({ kind: 'defer', code: 451 }, 1000);
    await control.clearFailures();
    await send();
    const response = await fetch(`${fake.url}/api/failures`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json' },
      body: JSON.stringify({ failure: { kind: 'defer', code: 550 }, times: 1 }),
    });
    expect(response.status).toBe(400);
  });

  it('from the form on the page', async () => {
    const press = (address: string, fields: Record<string, string>) =>
      fetch(`${fake.url}${address}`, {
        method: 'POST',
        body: new URLSearchParams(fields),
      });
    const page = await press('/fail', { kind: 'defer', times: '3' });
    expect(await page.text()).toContain('defer, 3 more times');
    await expect(send()).rejects.toMatchObject({ responseCode: 451 });
    await press('/work', {});
    await send();
  });
});

describe('the pages', () => {
  it('escape what is in a message', async () => {
    const attack = '<img src=x onerror=alert(1)>';
    await send({
      subject: attack,
      text: attack,
      attachments: [{ filename: `${attack}.txt`, content: 'x' }],
    });
    for (const address of ['/', '/messages/1']) {
      const page = await (await get(address)).text();
      expect(page).toContain('&lt;img src=x onerror=alert(1)&gt;');
      expect(page).not.toContain('<img');
    }
  });

  it('show HTML in a sandbox whose links open in a new tab', async () => {
    await send();
    const page = await (await get('/messages/1')).text();
    expect(page).toMatch(/<iframe[^>]*sandbox="allow-popups allow-popups-to-escape-sandbox"/);
    const frame = await get('/messages/1/html');
    expect(frame.headers.get('content-security-policy')).toMatch(/^sandbox .*default-src 'none'/);
    expect(await frame.text()).toMatch(/^<!doctype html>.*<head><base target="_blank" \/>/);
  });

  it('link the addresses in the text, fragment included', async () => {
    await send();
    const page = await (await get('/messages/1')).text();
    expect(page).toContain('<a href="http://127.0.0.1:4100/o/AB12#key" target="_blank"');
    expect(page).toContain('and &lt;come&gt; by.');
  });

  it('offer attachments as files, whatever their type', async () => {
    await send({
      attachments: [{ filename: 'care.html', content: '<b>x</b>' }],
    });
    const response = await get('/messages/1/attachments/0');
    expect(response.headers.get('content-disposition')).toMatch(/^attachment; filename=/);
    expect(response.headers.get('x-content-type-options')).toBe('nosniff');
  });

  it.each(['/messages/9', '/messages/9/html', '/messages/9/raw', '/messages/1/attachments/9'])(
    'know no %s',
    async (address) => {
      await send();
      expect((await get(address)).status).toBe(404);
    },
  );
});

describe('STARTTLS', () => {
  const port = (): number => Number(new URL(fake.smtpUrl).port);

  it('is taken by a client that trusts the certificate alone', async () => {
    await fake.stop();
    await restart({ startTls: true });
    const certificate = new X509Certificate(fake.certificate ?? '');
    expect(certificate.checkIP('127.0.0.1')).toBe('127.0.0.1');
    expect(certificate.checkHost('localhost')).toBe('localhost');
    expect(certificate.verify(certificate.publicKey)).toBe(true);

    const options = { host: '127.0.0.1', port: port(), requireTLS: true };
    await nodemailer.createTransport({ ...options, tls: { ca: fake.certificate } }).sendMail(mail);
    expect((await control.calls()).at(-1)).toMatchObject({
      outcome: 'accepted',
      tls: true,
    });
    await expect(nodemailer.createTransport(options).sendMail(mail)).rejects.toThrow(
      'self-signed certificate',
    );
  });

  it('is not offered otherwise', async () => {
    const options = { host: '127.0.0.1', port: port(), requireTLS: true };
    await expect(nodemailer.createTransport(options).sendMail(mail)).rejects.toThrow();
  });
});

it('stays up when a client vanishes in the middle of a message', async () => {
  await new Promise<void>((resolve, reject) => {
    const socket = createConnection(Number(new URL(fake.smtpUrl).port), '127.0.0.1');
    const lines = ['HELO me', 'MAIL FROM:<a@example.com>', 'RCPT TO:<b@example.com>', 'DATA'];
    socket.on('error', reject);
    socket.on('data', () => {
      const line = lines.shift();
      if (line !== undefined) socket.write(`${line}\r\n`);
      else socket.destroy();
    });
    socket.on('close', () => {
      resolve();
    });
  });
  await send();
  expect(await control.messages()).toHaveLength(1);
});

it('stores its calls without any body', async () => {
  await send();
  const stored = await readFile(path.join(folder, 'calls.jsonl'), 'utf8');
  expect(stored).toContain('rosa.whitlock@example.com');
  expect(stored).not.toContain('Follow it here');
});
