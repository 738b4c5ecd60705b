import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { smtpControl } from '#fakes/smtp/control.ts';
import { start } from '#fakes/smtp/start.ts';
import type { SmtpFake } from '#fakes/smtp/start.ts';
import type { SmtpFailure } from '#fakes/smtp/wire.ts';
import { createSmtpClient } from './smtp.ts';
import type { SmtpMessage } from './smtp.ts';

let fake: SmtpFake;
let secure: SmtpFake;

beforeAll(async () => {
  fake = await start({ port: 0, smtpPort: 0 });
  secure = await start({ port: 0, smtpPort: 0, startTls: true });
});
afterAll(() => Promise.all([fake.stop(), secure.stop()]));
beforeEach(() => Promise.all([smtpControl(fake.url).clear(), smtpControl(secure.url).clear()]));

const message: SmtpMessage = {
  messageId: '<one@oxbowlane.example>',
  date: new Date('2026-05-04T14:00:00Z'),
  from: 'Oxbow Lane Cake Studio <hello@oxbowlane.example>',
  to: 'ada@example.com',
  replyTo: 'hello@oxbowlane.example',
  subject: 'Order No. 2421: we have it 🎂',
  html: '<p>Grüße</p>',
  text: 'Grüße',
  inReplyTo: '<zero@oxbowlane.example>',
  references: ['<root@oxbowlane.example>', '<zero@oxbowlane.example>'],
  attachments: [
    {
      filename: 'pickup.ics',
      contentType: 'text/calendar; charset=utf-8; method=PUBLISH',
      base64: Buffer.from('BEGIN:VCALENDAR').toString('base64'),
    },
  ],
};

const plain = () => createSmtpClient({ url: fake.smtpUrl, requireTls: false });

describe('a message', () => {
  it('arrives with everything it was given', async () => {
    expect(await plain().send(message)).toMatchObject({ outcome: 'sent' });
    const [arrived] = await smtpControl(fake.url).messages();
    expect(arrived).toMatchObject({
      sender: 'hello@oxbowlane.example',
      to: ['ada@example.com'],
      subject: message.subject,
      messageId: message.messageId,
      inReplyTo: message.inReplyTo,
      references: message.references,
      text: expect.stringContaining('Grüße'),
      html: expect.stringContaining('Grüße'),
      attachments: [{ filename: 'pickup.ics', contentType: 'text/calendar' }],
    });
    const headers = new Map(arrived?.headers.map(({ name, value }) => [name, value]));
    expect(headers.get('Auto-Submitted')).toBe('auto-generated');
    expect(headers.get('Reply-To')).toBe('hello@oxbowlane.example');
    expect(headers.get('Date')).toBe('Mon, 04 May 2026 14:00:00 +0000');
    expect(await smtpControl(fake.url).attachment(arrived?.id ?? '', 0)).toBe('BEGIN:VCALENDAR');
  });

  it('is the same bytes each time it is sent', async () => {
    await plain().send(message);
    await plain().send(message);
    const control = smtpControl(fake.url);
    const [first, second] = await control.messages();
    expect(await control.raw(second?.id ?? '')).toBe(await control.raw(first?.id ?? ''));
  });

  it('can hide neither a header nor a second address', async () => {
    const sly = {
      ...message,
      to: 'ada@example.com, eve@example.com',
      subject: 'Hello\r\nBcc: eve@example.com',
      replyTo: 'a@example.com\r\nX-Sly: yes',
    };
    await plain().send(sly);
    for (const { to, headers } of await smtpControl(fake.url).messages()) {
      expect(to).not.toContain('eve@example.com');
      expect(headers.map(({ name }) => name.toLowerCase())).not.toContain('bcc');
      expect(headers.map(({ name }) => name.toLowerCase())).not.toContain('x-sly');
    }
  });
});

describe('the answer', () => {
  const cases: readonly (readonly [string, SmtpFailure, string])[] = [
    ['a 4xx to the address is for later', { kind: 'defer', code: 451 }, 'deferred'],
    ['a 5xx to the address is final', { kind: 'refuse', code: 550 }, 'refused'],
    ['a 5xx that asks for a password is about us', { kind: 'refuse', code: 530 }, 'unreachable'],
    ['a 4xx greeting says nothing of it', { kind: 'refuse-connection', code: 421 }, 'unreachable'],
    ['a 5xx greeting says nothing of it', { kind: 'refuse-connection', code: 554 }, 'unreachable'],
    ['a line cut after DATA leaves it open', { kind: 'drop-after-data' }, 'unreachable'],
    ['a slow yes is a yes', { kind: 'slow', ms: 200 }, 'sent'],
  ];

  it.each(cases)('%s', async (_name, failure, outcome) => {
    await smtpControl(fake.url).failNext(failure);
    expect(await plain().send(message)).toMatchObject({ outcome });
  });

  it('tells that nobody is there', async () => {
    const gone = await start({ port: 0, smtpPort: 0 });
    await gone.stop();
    const client = createSmtpClient({ url: gone.smtpUrl, requireTls: false });
    expect(await client.send(message)).toMatchObject({ outcome: 'unreachable' });
  });

  it('finds an address that cannot be one before the server is asked', async () => {
    const answer = await plain().send({ ...message, to: '' });
    expect(answer.outcome).toBe('refused');
    expect(await smtpControl(fake.url).messages()).toEqual([]);
  });
});

describe('where TLS is required', () => {
  it('sends nothing in the clear', async () => {
    const client = createSmtpClient({ url: fake.smtpUrl, requireTls: true });
    expect(await client.send(message)).toMatchObject({ outcome: 'unreachable' });
    expect(await smtpControl(fake.url).messages()).toEqual([]);
  });

  it('sends nothing to a server whose certificate it cannot check', async () => {
    const client = createSmtpClient({ url: secure.smtpUrl, requireTls: true });
    expect(await client.send(message)).toMatchObject({ outcome: 'unreachable' });
    expect(await smtpControl(secure.url).messages()).toEqual([]);
  });

  it('sends over TLS to a server it trusts', async () => {
    const { smtpUrl, url, certificate } = secure;
    const client = createSmtpClient({ url: smtpUrl, requireTls: true, trust: certificate });
    expect(await client.send(message)).toMatchObject({ outcome: 'sent' });
    expect(await smtpControl(url).calls()).toContainEqual(
      expect.objectContaining({ step: 'message', tls: true }),
    );
  });
});
