import { Token } from '#api/db/models/token.ts';
import { User } from '#api/db/models/user.ts';
import type { MailData } from '#api/mail/mail-data.ts';
import { renderMail } from '#api/mail/render-mail.ts';
import type { EventHandlers, HandlerContext } from '#api/outbox/events.ts';
import { keyOfLink, linkAddress } from '#api/platform/links.ts';
import { staffRole } from '#shared/contracts/vocabulary.ts';
import { loadHouse } from './house.queries.ts';
import type { MailDeps } from './mail-handlers.ts';
import { queueMail } from './queue-mail.command.ts';

type AccountMailHandlers = Pick<
  EventHandlers,
  | 'sign-in-link-asked'
  | 'sign-in-link-refused'
  | 'password-reset-asked'
  | 'action-to-confirm'
  | 'staff-invited'
>;

type LinkTemplate = 'sign-in-link' | 'password-reset' | 'action-to-confirm' | 'staff-invitation';

/** Mails with links that work once; whether a link still does is looked at again when it is sent. */
export function accountMailHandlers(deps: MailDeps): AccountMailHandlers {
  const sendLink = async <T extends LinkTemplate>(
    token: Token,
    { outboxId, uniqueKey }: HandlerContext,
    template: T,
    data: MailData[T],
  ): Promise<void> => {
    // An erased account takes its links' addresses along.
    if (token.email === null) return;
    const house = await loadHouse(deps);
    await queueMail(deps, {
      template,
      rendered: renderMail(template, data, house),
      to: token.email,
      replyTo: house.studio.email,
      outboxId,
      uniqueKey: `${uniqueKey}:${template}`,
      userId: token.userId,
      tokenId: token.id,
    });
  };

  const linkOf = (token: Token): { link: string; expiresAt: Date } => ({
    link: linkAddress(deps.env.publicUrl, token.purpose, keyOfLink(deps.env.sessionSecret, token)),
    expiresAt: token.expiresAt,
  });

  return {
    async 'sign-in-link-asked'({ tokenId }, context) {
      const token = await findToken(tokenId);
      await sendLink(token, context, 'sign-in-link', linkOf(token));
    },

    async 'sign-in-link-refused'({ userId }, { outboxId, uniqueKey }) {
      const user = await User.findByPk(userId, { rejectOnEmpty: true });
      if (user.email === null) return;
      const house = await loadHouse(deps);
      const link = `${deps.env.publicUrl}/sign-in/staff`;
      await queueMail(deps, {
        template: 'sign-in-link-refused',
        rendered: renderMail('sign-in-link-refused', { name: user.name, link }, house),
        to: user.email,
        replyTo: house.studio.email,
        outboxId,
        uniqueKey: `${uniqueKey}:sign-in-link-refused`,
        userId,
      });
    },

    async 'password-reset-asked'({ tokenId }, context) {
      const token = await findToken(tokenId);
      const name = token.user?.name ?? '';
      await sendLink(token, context, 'password-reset', { ...linkOf(token), name });
    },

    async 'action-to-confirm'({ tokenId }, context) {
      const token = await findToken(tokenId);
      const { action } = token.data;
      if (action !== 'erase-account') throw new Error('No mail asks to confirm this action.');
      const name = token.user?.name ?? '';
      await sendLink(token, context, 'action-to-confirm', { ...linkOf(token), name, action });
    },

    async 'staff-invited'({ tokenId }, context) {
      const token = await findToken(tokenId);
      const inviter =
        token.createdByUserId === null ? null : await User.findByPk(token.createdByUserId);
      await sendLink(token, context, 'staff-invitation', {
        ...linkOf(token),
        name: String(token.data['name'] ?? ''),
        role: staffRole.parse(token.role),
        invitedBy: inviter?.name ?? null,
      });
    },
  };
}

function findToken(id: string): Promise<Token> {
  return Token.findByPk(id, { rejectOnEmpty: true, include: [{ model: User, as: 'user' }] });
}
