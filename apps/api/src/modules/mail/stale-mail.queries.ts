import { Op } from 'sequelize';
import type { OrderStatus } from '#shared/contracts/vocabulary.ts';
import { isLive } from '#shared/orders/transitions.ts';
import { ContentChange } from '#api/db/models/content-change.ts';
import { Order } from '#api/db/models/order.ts';
import { SentMail } from '#api/db/models/sent-mail.ts';
import { Token } from '#api/db/models/token.ts';
import type { MailTemplate } from '#api/mail/mail-data.ts';
import { mailTemplate } from '#api/mail/words.ts';
import { hasPlace } from '#api/modules/plan/plan.queries.ts';

/** When a mail is still worth sending, by what its order has become meanwhile. */
type Freshness = {
  readonly while?: (status: OrderStatus) => boolean;
  /** A later one of its kind says all it has to say. */
  readonly newestOnly?: boolean;
  /** A place that was found again makes it untrue. */
  readonly withoutPlace?: boolean;
};

const asked = (status: OrderStatus): boolean => status === 'asked';
const settled = (status: OrderStatus): boolean =>
  status === 'confirmed' || status === 'making' || status === 'ready';

/**
 * Mails that tell how something ended or what somebody wrote are true whenever they come; the rest
 * are not sent once they would mislead. Mails with a link that works once are `ofToken`'s.
 */
const freshness: Readonly<Record<MailTemplate, Freshness>> = {
  'order-received': { while: isLive },
  confirmed: { while: settled },
  declined: {},
  withdrawn: {},
  moved: { while: isLive, newestOnly: true },
  'hold-ran-out': { while: asked, withoutPlace: true },
  'warmth-asked': { while: settled, newestOnly: true },
  'stop-lifted': { while: isLive },
  'private-link-renewed': { newestOnly: true },
  'ingredient-changed': { while: isLive },
  message: {},
  ready: { while: (status) => status === 'ready' },
  'thank-you': {},
  'sign-in-link': {},
  'action-to-confirm': {},
  'new-order': { while: isLive },
  'withdrawn-notice': {},
  'hold-ran-out-notice': { while: asked, withoutPlace: true },
  'customer-message': {},
  'ingredient-changed-notice': {},
  'staff-invitation': {},
  'password-reset': {},
  'sign-in-link-refused': {},
  'mail-given-up': {},
};

/** Why a mail is not to be sent any more, or null. What staff send again is theirs to judge. */
export async function whyStale(mail: SentMail, now: Date): Promise<string | null> {
  if (mail.erasedAt !== null) return 'It was erased.';
  if (mail.tokenId !== null) return ofToken(mail.tokenId, now);
  if (mail.orderId === null || mail.resendOfId !== null) return null;
  return ofOrder(mail, mail.orderId, freshness[mailTemplate.parse(mail.template)]);
}

async function ofToken(tokenId: string, now: Date): Promise<string | null> {
  const token = await Token.findByPk(tokenId);
  if (token === null || token.usedAt !== null) return 'Its link has been used or taken back.';
  return token.expiresAt <= now ? 'Its link has run out.' : null;
}

async function ofOrder(mail: SentMail, orderId: string, rule: Freshness): Promise<string | null> {
  const { status } = await Order.findByPk(orderId, { rejectOnEmpty: true });
  if (rule.while?.(status) === false) return `The order is ${status} now.`;
  if (mail.template === 'ingredient-changed' && (await wasTakenBack(mail))) {
    return 'It was put right.';
  }
  if (rule.newestOnly === true && (await hasLater(mail, orderId))) return 'A later one says it.';
  if (rule.withoutPlace === true && (await hasPlace(orderId)))
    return 'The order has a place again.';
  return null;
}

async function hasLater({ id, template }: SentMail, orderId: string): Promise<boolean> {
  const where = { orderId, template, resendOfId: null, id: { [Op.gt]: id } };
  return (await SentMail.findOne({ where })) !== null;
}

/** Changed contents that were put right before anybody was told, by the key of the mail. */
async function wasTakenBack({ uniqueKey }: SentMail): Promise<boolean> {
  const change = await ContentChange.findByPk(uniqueKey.split(':')[1]);
  return change !== null && change.endedAt !== null;
}
