import { contentDifferences } from '#shared/kitchen/content-differences.ts';
import { ContentChange } from '#api/db/models/content-change.ts';
import { Order } from '#api/db/models/order.ts';
import { User } from '#api/db/models/user.ts';
import type { MailData } from '#api/mail/mail-data.ts';
import { renderMail } from '#api/mail/render-mail.ts';
import { causesOf } from '#api/modules/contents/content-changes.queries.ts';
import type { EventHandlers } from '#api/outbox/events.ts';
import { loadHouse } from './house.queries.ts';
import type { MailDeps } from './mail-handlers.ts';
import { loadToldOrder, mailPickupOf } from './mail-order.queries.ts';
import { queueMail } from './queue-mail.command.ts';

type ContentsMailHandlers = Pick<EventHandlers, 'contents-changed' | 'contents-to-tell'>;

/** Mails about what orders contain now: to the studio once for a save, to each customer in turn. */
export function contentsMailHandlers(deps: MailDeps): ContentsMailHandlers {
  return {
    async 'contents-changed'({ saveId }, { outboxId, uniqueKey }) {
      const changes = await ContentChange.findAll({ where: { saveId, endedAt: null } });
      const [first] = changes;
      if (first === undefined) return;
      const house = await loadHouse(deps);
      const causes = await causesOf(changes);
      const by = await User.findByPk(first.byUserId, { rejectOnEmpty: true });
      const orders = await Order.findAll({
        where: { id: changes.map(({ orderId }) => orderId) },
        order: [['number', 'ASC']],
      });
      const data: MailData['ingredient-changed-notice'] = {
        cause: causes.get(first.id) ?? '',
        by: by.name,
        orders: orders.flatMap((order) => {
          const change = changes.find(({ orderId }) => orderId === order.id);
          if (change === undefined) return [];
          return [
            {
              number: order.number,
              link: `${deps.env.publicUrl}/staff/orders/${String(order.number)}`,
              pickup: mailPickupOf(order),
              changes: contentDifferences(change.told, change.holds, house.studio.labelRegion),
              clashes: change.clashes,
            },
          ];
        }),
      };
      await queueMail(deps, {
        template: 'ingredient-changed-notice',
        rendered: renderMail('ingredient-changed-notice', data, house),
        to: house.studio.email,
        replyTo: null,
        outboxId,
        uniqueKey: `${uniqueKey}:ingredient-changed-notice`,
      });
    },

    async 'contents-to-tell'({ orderId, contentChangeId }, { outboxId, uniqueKey }) {
      const change = await ContentChange.findByPk(contentChangeId, { rejectOnEmpty: true });
      // Put right meanwhile, or a later change says it.
      if (change.endedAt !== null) return;
      const { house, email, forCustomer } = await loadToldOrder(deps, orderId);
      // Taken at the counter without an address, or erased: the staff tell them.
      if (email === null) return;
      const data: MailData['ingredient-changed'] = {
        order: forCustomer,
        changes: contentDifferences(change.told, change.holds, house.studio.labelRegion),
      };
      await queueMail(deps, {
        template: 'ingredient-changed',
        rendered: renderMail('ingredient-changed', data, house),
        to: email,
        replyTo: house.studio.email,
        outboxId,
        orderId,
        uniqueKey: `${uniqueKey}:ingredient-changed`,
      });
    },
  };
}
