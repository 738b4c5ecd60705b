import * as z from 'zod/mini';
import type { MailTemplate } from './mail-data.ts';
import { oneLine } from './plain.ts';

/** What a studio may say in its own way; the facts between lead and closing are the order's. */
export type MailWords = {
  readonly subject: string;
  readonly lead: string;
  /** Empty for none. */
  readonly closing: string;
};

/**
 * The house's words. `{name}`, `{number}`, `{day}`, `{studio}` and `{role}` are filled in where a
 * mail knows them. A row of `email_texts` takes the place of an entry.
 */
export const standardWords: Readonly<Record<MailTemplate, MailWords>> = {
  'order-received': {
    subject: 'Order No. {number}: we have it',
    lead: 'Hello {name},\n\nThank you for asking us. Your order for {day} is here, and a baker will read all of it before we answer.',
    closing: 'Something not right? Write to us from your order’s page, or answer this e-mail.',
  },
  confirmed: {
    subject: 'Order No. {number} is confirmed for {day}',
    lead: 'Hello {name},\n\nIt is settled: we make your cake for {day}. The file with this e-mail puts the pickup into your calendar.',
    closing: 'We look forward to making it. If anything changes, tell us as early as you can.',
  },
  declined: {
    subject: 'Order No. {number}: we cannot take it',
    lead: 'Hello {name},\n\nWe are sorry: we cannot make this cake for {day}.',
    closing:
      'Nothing is owed, and we keep no place for it any more. We would gladly bake for you another time.',
  },
  withdrawn: {
    subject: 'Order No. {number} is withdrawn',
    lead: 'Hello {name},\n\nYou have taken your order for {day} back. We keep no place for it any more, and nothing is owed.',
    closing: 'Was that not you? Then answer this e-mail or ring us, and we will put it right.',
  },
  moved: {
    subject: 'Order No. {number}: your pickup is now {day}',
    lead: 'Hello {name},\n\nWe have moved the pickup of your cake. Please read the new day and time below.',
    closing:
      'If that does not suit you, tell us soon: write from your order’s page, answer this e-mail, or ring us.',
  },
  'hold-ran-out': {
    subject: 'Order No. {number}: your date is not kept any more',
    lead: 'Hello {name},\n\nThe time for which we kept a place for {day} is over, so somebody else may take it now. Your order itself is still with us.',
    closing:
      'Do you still want the cake? You need not order again: write to us from your order’s page, and we look for a place.',
  },
  'warmth-asked': {
    subject: 'Order No. {number}: how warm will it be on {day}?',
    lead: 'Hello {name},\n\nWhen you ordered, nobody could know how warm it would be. Your day is close now, and we ask once more, so that your cake stands up well.',
    closing: 'An answer to this e-mail, or a word by telephone, does as well.',
  },
  'stop-lifted': {
    subject: 'Order No. {number}: please read this about your cake',
    lead: 'Hello {name},\n\nSomething about your order had to be settled first. The owner has looked at it and takes it on, for a reason that is yours to read.',
    closing:
      'Please read it with care. What is in the cake has not changed. If it is not what you talked about with us, do not accept it: answer this e-mail or ring us.',
  },
  'private-link-renewed': {
    subject: 'Order No. {number}: a new link to your order',
    lead: 'Hello {name},\n\nHere is a new private link to your order. The links in earlier e-mails do not open it any more.',
    closing:
      'Whoever has the link can read your order and write to us about it, so keep it to yourself.',
  },
  'ingredient-changed': {
    subject: 'Order No. {number}: something in your cake has changed',
    lead: 'Hello {name},\n\nSomething we make your cake with has changed, and with it what is in your cake. Please read this before {day}, and tell whoever it matters to.',
    closing:
      'If this does not suit somebody at your table, write to us from your order’s page, answer this e-mail or ring us: we look for a way with you. Ask a doctor what is right for somebody with an allergy.',
  },
  message: {
    subject: 'Order No. {number}: a message from {studio}',
    lead: 'Hello {name},\n\nWe have written to you about your order:',
    closing: '',
  },
  ready: {
    subject: 'Order No. {number}: your cake is ready',
    lead: 'Hello {name},\n\nYour cake is ready and waits for you in the cold.',
    closing: 'Have the order’s number with you: No. {number}. We wish you a lovely day.',
  },
  'thank-you': {
    subject: 'Order No. {number}: thank you',
    lead: 'Hello {name},\n\nYour cake has left our counter. Thank you for letting us make it.',
    closing: 'If anything was not as it should be, tell us: that is how we get better.',
  },
  'sign-in-link': {
    subject: 'Your link to sign in at {studio}',
    lead: 'Hello,\n\nSomebody, we hope you, asked to sign in with this address.',
    closing: 'If it was not you, do nothing: without the link nobody gets in.',
  },
  'action-to-confirm': {
    subject: 'Please confirm: erase your account at {studio}',
    lead: 'Hello {name},\n\nYou asked us to erase your account and what we keep about you. We do it once you say so again.',
    closing: 'If it was not you, do nothing, and nothing happens.',
  },
  'new-order': {
    subject: 'New order No. {number} for {day}, {name}',
    lead: '{name} has sent an order for {day}.',
    closing: '',
  },
  'withdrawn-notice': {
    subject: 'Order No. {number} was withdrawn, {name}',
    lead: '{name} has taken the order for {day} back. Its place in the plan is free again.',
    closing: '',
  },
  'hold-ran-out-notice': {
    subject: 'Order No. {number} has lost its place, {name}',
    lead: 'The hold of the order for {day} has run out, and its place in the plan is free. The order is still asked for and waits for your answer.',
    closing: '',
  },
  'customer-message': {
    subject: 'Order No. {number}: {name} has written',
    lead: '{name} has written about the order for {day}:',
    closing: 'Answer on the order’s page, so that everybody here can read it there.',
  },
  'ingredient-changed-notice': {
    subject: 'What is in {orders} has changed',
    lead: '{by} has changed something in the pantry, and with it what open orders contain. Their customers are told by e-mail in a few minutes, unless it is put right before. No cake among them is marked ready or handed over until its customer knows.',
    closing: 'Open each order and say that you have seen to it.',
  },
  'staff-invitation': {
    subject: 'Come and work with {studio}',
    lead: 'Hello {name},\n\nYou are invited to the order book of {studio}, as {role}.',
    closing: 'If you do not know what this is about, do nothing.',
  },
  'password-reset': {
    subject: 'Choose a new password for {studio}',
    lead: 'Hello {name},\n\nSomebody, we hope you, asked for a new password.',
    closing: 'If it was not you, do nothing: your password stays as it is.',
  },
  'sign-in-link-refused': {
    subject: 'How you sign in at {studio}',
    lead: 'Hello {name},\n\nSomebody, we hope you, asked for a link to sign in. Whoever works here signs in with a password, never by a link.',
    closing: 'If it was not you, do nothing.',
  },
  'mail-given-up': {
    subject: 'An e-mail could not be delivered',
    lead: 'An e-mail of ours did not arrive, and we have stopped trying.',
    closing:
      'If the address is wrong, ring the customer. If the mail server is at fault, put that right and send the e-mail again from its page.',
  },
};

/** The name of a mail as a row has it. */
export const mailTemplate = z.custom<MailTemplate>(
  (name) => typeof name === 'string' && Object.hasOwn(standardWords, name),
);

/** Words with their gaps filled, in one go: what is filled in is not looked through again. */
export function fillIn(words: string, values: Readonly<Record<string, string>>): string {
  return words.replaceAll(/\{(\w+)\}/g, (gap, name: string) =>
    Object.hasOwn(values, name) ? (values[name] ?? gap) : gap,
  );
}

/** A subject of a length that inboxes show, on one line as long as each value is. */
export function subjectOf(words: string, values: Readonly<Record<string, string>>): string {
  const subject = fillIn(oneLine(words), values);
  const characters = Array.from(subject);
  return characters.length <= 150 ? subject : `${characters.slice(0, 149).join('').trimEnd()}…`;
}
