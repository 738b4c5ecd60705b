import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { House } from './house.ts';
import type { MailData, MailOrder, MailTemplate } from './mail-data.ts';
import { renderMail } from './render-mail.ts';
import type { RenderedMail } from './render-mail.ts';
import { standardWords } from './words.ts';

const house: House = {
  studio: {
    name: 'Oxbow Lane Cake Studio',
    address: '14 Oxbow Lane, Alder Falls, NY 13999',
    phone: '+1 607 555 0114',
    email: 'hello@oxbowlane.example',
    zone: 'America/New_York',
    locale: 'en-US',
    labelRegion: 'US',
    temperatureLead: 'F',
    lengthLead: 'in',
  },
  publicUrl: 'https://cakes.example',
  words: {},
};

const orderLink = 'https://cakes.example/orders/7K2M9QXW4D#key=abcdefghijklmnopqrstuv';
const oneTime = 'https://cakes.example/links/sign-in#abcdefghijklmnopqrstuv';

/** An order in which everything a person typed is `typed`. */
const orderOf = (typed: string): MailOrder => ({
  number: 2421,
  link: orderLink,
  name: typed,
  collector: typed,
  pickup: { date: '2027-06-19', start: 600, minutes: 30 },
  occasion: typed,
  headCount: 70,
  summary: 'Three tiers, 10, 8 and 5 in, 71 portions',
  chosen: [{ label: 'Words on it', value: typed }],
  tiers: [{ widthMm: 254, heightMm: 102, colour: '#f3ead2' }],
  price: {
    currency: 'USD',
    lines: [{ label: typed, amountMinor: 24_700 }],
    totalMinor: 24_700,
  },
  contains: ['wheat', 'egg', 'milk'],
  mayContain: ['soy'],
  handled: ['sesame'],
  keepCool: 'Keep it in the fridge, at 41 °F / 5 °C or colder.',
  beforeEating: [typed],
  weightG: 5400,
  heightMm: 330,
});

/** 10:30 on Monday 3 May by the studio's clock. */
const expiresAt = new Date('2027-05-03T14:30:00Z');

function dataOf(typed: string): { readonly [T in MailTemplate]: MailData[T] } {
  const order = orderOf(typed);
  const link = { link: oneTime, expiresAt, name: typed };
  return {
    'order-received': {
      order,
      hold: { expiresAt, needsLink: true },
      dateOpen: false,
      stops: [typed],
      cares: [typed],
      answerHours: 48,
    },
    confirmed: { order, note: typed },
    declined: { order, reason: typed, nearest: ['2027-06-18', '2027-06-25'] },
    withdrawn: { order },
    moved: {
      order,
      from: { date: '2027-06-18', start: 900, minutes: 30 },
      note: typed,
      calendar: true,
    },
    'hold-ran-out': { order },
    'warmth-asked': { order },
    'stop-lifted': { order },
    'private-link-renewed': { order },
    message: { order, by: typed, body: typed },
    ready: { order, openings: ['Tuesday to Friday, 10:00 to 18:00'] },
    'thank-you': { order },
    'sign-in-link': link,
    'action-to-confirm': { ...link, action: 'erase-account' },
    'new-order': {
      order,
      hold: null,
      dateOpen: true,
      stops: [typed],
      cares: [typed],
      aboutGuests: 'allergy',
    },
    'withdrawn-notice': { order, reason: typed },
    'hold-ran-out-notice': { order },
    'ingredient-changed': { order, changes: [typed] },
    'ingredient-changed-notice': {
      cause: typed,
      by: typed,
      orders: [
        {
          number: 2421,
          link: 'https://cakes.example/staff/orders/2421',
          pickup: { date: '2027-06-18', start: 900, minutes: 30 },
          changes: [typed],
          clashes: true,
        },
      ],
    },
    'customer-message': { order, by: typed, body: typed },
    'staff-invitation': { ...link, role: 'baker', invitedBy: typed },
    'password-reset': link,
    'sign-in-link-refused': { name: typed, link: 'https://cakes.example/sign-in/staff' },
    'mail-given-up': {
      subject: typed,
      to: typed,
      reason: typed,
      orderNumber: 2421,
      link: 'https://cakes.example/staff/mail/31',
    },
  };
}

function render<T extends MailTemplate>(template: T, typed = 'Mara Ellery'): RenderedMail {
  return renderMail(template, dataOf(typed)[template], house);
}

const templates = Object.keys(standardWords).filter(
  (name): name is MailTemplate => name in standardWords,
);

/** What a reader sees of the HTML. */
const readable = (html: string): string =>
  html
    .replace(/<style>[\s\S]*<\/style>/, '')
    .replaceAll(/<[^>]+>/g, ' ')
    .replaceAll(/\s+/g, ' ');

describe.each(templates)('%s', (template) => {
  it('carries the studio’s name, address, telephone and e-mail, in both forms', () => {
    const { html, text } = render(template);
    for (const known of [house.studio.name, house.studio.address, house.studio.phone]) {
      expect(text).toContain(known);
      expect(readable(html)).toContain(known);
    }
  });

  it('has its link in both forms', () => {
    const { html, text } = render(template);
    const [link] = /https:\/\/cakes\.example\/\S+/.exec(text) ?? [];
    expect(link).toBeDefined();
    expect(html).toContain(`href="${link}"`);
  });

  it('leaves no gap unfilled', () => {
    const { subject, html, text } = render(template);
    for (const part of [subject, text, readable(html)]) expect(part).not.toMatch(/\{\w+\}/);
    expect(`${subject}${text}`).not.toMatch(/undefined|null|NaN|\[object/);
  });

  it('fetches nothing and runs nothing', () => {
    const { html } = render(template);
    expect(html).not.toMatch(/<(?:img|script|link|iframe|form|video|object)\b/i);
    expect(html).not.toMatch(/url\(|@import|\bsrc=|\bon\w+=/i);
  });

  it('is ready for dark rooms: every ground beside a text has a counterpart', () => {
    const { html } = render(template);
    expect(html).toContain('<meta name="color-scheme" content="light dark" />');
    const dark = html.slice(html.indexOf('prefers-color-scheme: dark'), html.indexOf('</style>'));
    for (const [, classes] of html.matchAll(/class="([^"]+)"[^>]*background-color/g)) {
      const known = (classes ?? '').split(/\s+/).some((name) => dark.includes(`.${name} {`));
      expect(`${classes} ${known}`).toBe(`${classes} true`);
    }
  });

  it('never says that a cake is safe or free from something', () => {
    const { html, text } = render(template);
    for (const form of [text, readable(html)]) {
      expect(form).not.toMatch(/\bsafe(?:ly)?\b|\bfree (?:from|of)\b|allergen-free/i);
    }
  });

  it('survives whatever is typed: no markup, no second header, no turned words', () => {
    const sly = '<img src=x onerror=alert(1)>"\'&\r\nBcc: eve@example.com\u202E\u0000 {day}';
    const { subject, html, text } = render(template, sly);
    expect(html).not.toContain('<img');
    expect(html).not.toContain('\u202E');
    expect(text).not.toContain('\u202E');
    expect(subject).not.toMatch(/[\p{Cc}\u202E]/u);
    expect(`${html}${text}`).not.toContain('\u0000');
    // What was typed is not filled in again.
    if (html.includes('Bcc:')) expect(readable(html)).toContain('{day}');
  });
});

describe('any name', () => {
  it('comes through whole, in both forms, whatever letters it is in', () => {
    for (const name of ['Mara Ellery', 'מרה אלרי', 'مارا', '山田 花子', 'Zoë 🎂 O’Neill']) {
      const { html, text, subject } = render('new-order', name);
      expect(readable(html)).toContain(name);
      expect(text).toContain(name);
      expect(subject).toContain(name);
    }
  });

  it('written from right to left is kept to itself', () => {
    expect(render('new-order', 'מרה').subject).toContain('\u2068מרה\u2069');
  });

  it('never breaks the subject’s line or length', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 400 }), (name) => {
        const { subject } = render('new-order', name);
        expect(subject).not.toMatch(/\p{Cc}/u);
        expect(Array.from(subject).length).toBeLessThanOrEqual(150);
      }),
    );
  });
});

describe('the words', () => {
  it('say until when a place is kept, by the studio’s clock, and what keeps it longer', () => {
    const { text } = render('order-received');
    expect(text).toContain('Monday 3 May, 10:30 (EDT)');
    expect(text.replaceAll(/\s+/g, ' ')).toContain('at most 48 hours');
  });

  it('do not ask to open the link where nothing depends on it', () => {
    const data = dataOf('Mara')['order-received'];
    const hold = { expiresAt, needsLink: false };
    const { text } = renderMail('order-received', { ...data, hold }, house);
    expect(text).not.toContain('open your order once');
    expect(text.replaceAll(/\s+/g, ' ')).toContain('We answer before then');
  });

  it('promise nothing where there is no place', () => {
    const data = dataOf('Mara')['order-received'];
    const { text } = renderMail('order-received', { ...data, hold: null, dateOpen: true }, house);
    expect(text.replaceAll(/\s+/g, ' ')).toContain('No place is kept until then');
  });

  it('offer days to press with a decline', () => {
    const { html, text } = render('declined');
    expect(text).toContain(
      'Friday 18 June 2027\n  https://cakes.example/order/day?date=2027-06-18',
    );
    expect(html).toContain('href="https://cakes.example/order/day?date=2027-06-25"');
  });

  it('are the studio’s own where it has written some', () => {
    const words = {
      'thank-you': { subject: 'Bye, {name}', lead: 'Until soon, {name}!\n\nIda', closing: '' },
    };
    const data = dataOf('Mara')['thank-you'];
    const { subject, text, html } = renderMail('thank-you', data, { ...house, words });
    expect(subject).toBe('Bye, Mara');
    expect(text).toContain('Until soon, Mara!\n\nIda');
    expect(readable(html)).toContain('Until soon, Mara!');
  });

  it('do not tell what guests cannot eat', () => {
    const { text } = render('new-order');
    expect(text.replaceAll(/\s+/g, ' ')).toContain(
      'stands on the order’s page and not in this e-mail',
    );
  });
});

describe('plain text', () => {
  it('keeps to lines that mail programs show whole, addresses apart', () => {
    for (const template of templates) {
      for (const line of render(template).text.split('\n')) {
        if (!line.includes('https://')) expect(line.length).toBeLessThanOrEqual(78);
      }
    }
  });

  it('marks what somebody else wrote', () => {
    const data = dataOf('Ida').message;
    const { text } = renderMail('message', { ...data, body: 'One.\n\nTwo.' }, house);
    expect(text).toContain('Ida:\n> One.\n>\n> Two.');
  });
});
