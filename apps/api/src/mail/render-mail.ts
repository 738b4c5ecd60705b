import type { MailBody } from './content.ts';
import type { House } from './house.ts';
import type { MailData, MailTemplate } from './mail-data.ts';
import { nameInText, proseOf } from './plain.ts';
import { accountTemplates } from './templates/account.ts';
import { orderTemplates } from './templates/order.ts';
import { staffTemplates } from './templates/staff.ts';
import { toHtml } from './to-html.ts';
import { toText } from './to-text.ts';
import { fillIn, standardWords, subjectOf } from './words.ts';

export type RenderedMail = {
  readonly subject: string;
  readonly html: string;
  readonly text: string;
};

/** How each mail is made of its data. */
export type Templates = {
  readonly [T in MailTemplate]: (data: MailData[T], house: House) => MailBody;
};

const templates: Templates = { ...orderTemplates, ...staffTemplates, ...accountTemplates };

/** A mail in both its forms. Pure: the same data and house give the same bytes. */
export function renderMail<T extends MailTemplate>(
  template: T,
  data: MailData[T],
  house: House,
): RenderedMail {
  const body = templates[template](data, house);
  const words = house.words[template] ?? standardWords[template];
  const fill = { ...body.fill, studio: nameInText(house.studio.name) };
  const content = {
    ...body,
    lead: fillIn(proseOf(words.lead), fill),
    closing: fillIn(proseOf(words.closing), fill),
  };
  return {
    subject: subjectOf(words.subject, fill),
    html: toHtml(content, house),
    text: toText(content, house),
  };
}
