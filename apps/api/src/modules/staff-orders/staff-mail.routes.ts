import * as z from 'zod/mini';
import { done, itIsDone } from '#shared/contracts/common.ts';
import { sentMailView } from '#shared/contracts/staff.ts';
import type { SentMail } from '#api/db/models/sent-mail.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import { reveal } from '#api/modules/authorise.ts';
import type { Deps } from '#api/modules/deps.ts';
import { sendMailAgain } from '#api/modules/mail/send-mail-again.command.ts';
import { findSentMail, presentSentMail } from '#api/modules/mail/sent-mail.queries.ts';
import { noteOrderEvent } from '#api/modules/orders/note-order-event.command.ts';
import type { Staff } from '#api/platform/actor.ts';
import { authoriseStaff } from './authorise-staff.ts';

const params = z.object({ id: z.string().check(z.maxLength(20)) });

/** What was sent, exactly, and sending it once more. */
export function staffMailRoutes(_deps: Deps): FeatureRoutes {
  const routes = createRoutes();

  routes.add(
    {
      name: 'see-mail',
      method: 'get',
      path: '/api/staff/mail/:id',
      summary: 'An e-mail as it was sent, but for the keys of its links.',
      params,
      response: sentMailView,
      refusals: ['not-found'],
    },
    async ({ actor, params: { id } }) => {
      const staff = authoriseStaff(actor, 'see-orders');
      return presentSentMail(await findReadable(staff, id));
    },
  );

  routes.add(
    {
      name: 'send-mail-again',
      method: 'post',
      path: '/api/staff/mail/:id/send-again',
      summary: 'Send an e-mail once more, as it was, to the same address.',
      params,
      response: done,
      status: 202,
      refusals: ['not-found', 'wrong-state'],
    },
    async ({ actor, params: { id } }) => {
      const staff = authoriseStaff(actor, 'send-mail-again');
      const mail = await findReadable(staff, id);
      await inTransaction(async () => {
        await sendMailAgain(mail, staff.userId);
        if (mail.orderId === null) return;
        await noteOrderEvent({
          orderId: mail.orderId,
          kind: 'mail-sent-again',
          actor: staff,
          data: { sentMailId: mail.id },
        });
      });
      return itIsDone;
    },
  );
  return routes;
}

/** Mails about orders are for all staff; those about accounts for the owner. */
async function findReadable(staff: Staff, id: string): Promise<SentMail> {
  const mail = await findSentMail(id);
  reveal(mail.orderId !== null || staff.role === 'owner');
  return mail;
}
