import type { StaffRole } from '#shared/contracts/vocabulary.ts';
import { button, text } from '../content.ts';
import type { Block } from '../content.ts';
import type { House } from '../house.ts';
import { nameInText } from '../plain.ts';
import type { Templates } from '../render-mail.ts';
import { momentText } from '../when.ts';

type AccountTemplates = Pick<
  Templates,
  | 'sign-in-link'
  | 'sign-in-link-refused'
  | 'password-reset'
  | 'action-to-confirm'
  | 'staff-invitation'
>;

/** The role with its article, as an invitation says it. */
const roleNames: Readonly<Record<StaffRole, string>> = {
  counter: 'someone at the counter',
  baker: 'a baker',
  owner: 'an owner',
};

/** Mails with links that work once, and what belongs to them. */
export const accountTemplates: AccountTemplates = {
  'sign-in-link': ({ link, expiresAt }, house) => ({
    title: 'Sign in',
    preview: 'The link works once, for 15 minutes.',
    fill: {},
    blocks: oneTimeLink('Sign in', link, expiresAt, house),
  }),

  'sign-in-link-refused': ({ name, link }) => ({
    title: 'How you sign in',
    preview: 'With your password, not by a link.',
    fill: { name: nameInText(name) },
    blocks: [button('Sign in with your password', link)],
  }),

  'password-reset': ({ name, link, expiresAt }, house) => ({
    title: 'Choose a new password',
    preview: 'The link works once, for 15 minutes.',
    fill: { name: nameInText(name) },
    blocks: [
      ...oneTimeLink('Choose a new password', link, expiresAt, house),
      text('Choosing one signs you out everywhere else.'),
    ],
  }),

  'action-to-confirm': ({ name, link, expiresAt }, house) => ({
    title: 'Erase your account?',
    preview: 'Nothing happens until you confirm.',
    fill: { name: nameInText(name) },
    blocks: [
      text(
        'Your name, addresses, messages, photos and what you told us about guests go for good. What was made and paid stays in our books, without you.',
      ),
      ...oneTimeLink('Confirm', link, expiresAt, house),
    ],
  }),

  'staff-invitation': ({ name, role, invitedBy, link, expiresAt }, house) => ({
    title: 'You are invited',
    preview: `To the order book of ${house.studio.name}`,
    fill: { name: nameInText(name), role: roleNames[role] },
    blocks: [
      ...(invitedBy === null ? [] : [text(`${nameInText(invitedBy)} has invited you.`)]),
      ...oneTimeLink('Choose your password', link, expiresAt, house),
    ],
  }),
};

function oneTimeLink(label: string, link: string, expiresAt: Date, house: House): Block[] {
  return [button(label, link), text(`The link works once, until ${momentText(expiresAt, house)}.`)];
}
