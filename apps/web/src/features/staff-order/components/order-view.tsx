import { useState, type ReactNode } from 'react';
import type { Advice } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import type { OrderStatus } from '#shared/contracts/vocabulary.ts';
import { CakeDrawing } from '#web/components/cake-drawing/cake-drawing.tsx';
import { CuttingPlan } from '#web/components/cutting-plan/cutting-plan.tsx';
import { AdviceNote, byGravity } from '#web/components/order/advice-note.tsx';
import { MadeWith } from '#web/components/order/made-with.tsx';
import { plainly } from '#web/components/order/plainly.ts';
import { PriceList } from '#web/components/order/price-list.tsx';
import { Fold } from '#web/components/ui/fold.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { OrderActionDialog } from '../actions/order-action-dialog.tsx';
import type { OrderAct } from '../actions/order-act.ts';
import { CareBlock } from './care-block.tsx';
import { ContentChanges } from './content-changes.tsx';
import { HandoverRecord } from './handover-record.tsx';
import { OrderChoices } from './order-choices.tsx';
import { OrderContacts } from './order-contacts.tsx';
import { OrderEvents } from './order-events.tsx';
import { OrderHead } from './order-head.tsx';
import { OrderMail } from './order-mail.tsx';
import { OrderMessages } from './order-messages.tsx';
import { OrderPhotos } from './order-photos.tsx';
import { OrderPlan } from './order-plan.tsx';
import { OrderStructure } from './order-structure.tsx';

/** What other features show of the order; the page puts them in, each with its own heading. */
export type OrderParts = {
  /** Under the price: what it costs to make, for the owner. */
  readonly cost?: ReactNode;
  /** The same in a line, where it is about to be confirmed. */
  readonly margin?: ReactNode;
  /** What goes into it, formula by formula; as wide as the page. */
  readonly kitchen?: ReactNode;
  /** What is printed for it. */
  readonly cards?: ReactNode;
};

type Props = { readonly order: StaffOrder; readonly menu: Menu; readonly parts?: OrderParts };

/** How much of the drawing is filled in by how far the cake is. */
const made: Readonly<Record<OrderStatus, number>> = {
  asked: 1,
  quoted: 1,
  agreed: 1,
  confirmed: 1,
  making: 0.6,
  ready: 1,
  collected: 1,
  declined: 1,
  withdrawn: 1,
  lapsed: 1,
  cancelled: 1,
  uncollected: 1,
};

/** Said above, with the allergies they are about. */
const aboutAllergies: readonly Advice['code'][] = [
  'allergen',
  'kitchen',
  'allergen-unknown',
  'allergy-text',
];

/** One order, everything in one place; what may be done is what the server says. */
export function OrderView({ order, menu, parts = {} }: Props) {
  const [act, setAct] = useState<OrderAct | null>(null);
  const { cake, look } = order.design;
  const { locale, labelRegion, kitchenNotice } = menu.studio;
  const said = new Set([...order.blockers, ...order.lifted].map((it) => `${it.code} ${it.about}`));
  const advice = order.estimate.advice.filter(
    (it) =>
      it.level !== 'ok' && !aboutAllergies.includes(it.code) && !said.has(`${it.code} ${it.about}`),
  );
  return (
    <div className="grid gap-8">
      <OrderHead order={order} menu={menu} onAct={setAct} />
      <CareBlock order={order} menu={menu} />
      <ContentChanges order={order} studio={menu.studio} />
      <div className="grid items-start gap-x-8 gap-y-8 md:grid-cols-[minmax(18rem,0.8fr)_minmax(0,1fr)]">
        <div className="grid min-w-0 gap-8">
          <Rim className="grid gap-5 p-5 sm:p-7">
            <CakeDrawing cake={cake} look={look} menu={menu} made={made[order.status]} />
            <PriceList
              price={order.agreedPrice ?? order.estimate.price}
              totalLabel={order.agreedPrice === null ? 'Offer, not confirmed yet' : 'Agreed'}
              locale={locale}
            />
            {order.estimate.keepCool !== '' && (
              <p className="text-sm text-slate">{order.estimate.keepCool}</p>
            )}
          </Rim>
          {parts.cost}
          <Section title="Messages">
            <OrderMessages order={order} menu={menu} />
          </Section>
        </div>
        <div className="grid min-w-0 gap-8">
          {order.handover !== null && (
            <Section title="Handed over">
              <HandoverRecord handover={order.handover} menu={menu} />
            </Section>
          )}
          <Section title="As they chose it">
            <OrderChoices order={order} menu={menu} />
          </Section>
          {advice.length > 0 && (
            <Section title="To mind">
              <ul className="grid gap-3">
                {byGravity(advice).map((it) => (
                  <li key={`${it.code} ${it.about}`}>
                    <AdviceNote advice={plainly(it)} />
                  </li>
                ))}
              </ul>
            </Section>
          )}
          <Section title="What is in it">
            <MadeWith offer={order.estimate} region={labelRegion} kitchenNotice={kitchenNotice} />
          </Section>
          {parts.cards}
          {cake !== null && (
            <Section title="Before boxing">
              <OrderStructure order={order} menu={menu} />
            </Section>
          )}
          {cake !== null && (
            <Section title="Cutting">
              <Fold label={`How ${order.estimate.portions.fed} portions are cut`}>
                <CuttingPlan design={order.design} menu={menu} />
              </Fold>
            </Section>
          )}
        </div>
      </div>
      {parts.kitchen}
      <Section title="Photos">
        <OrderPhotos order={order} />
      </Section>
      <div className="grid items-start gap-x-8 gap-y-8 md:grid-cols-[minmax(18rem,0.8fr)_minmax(0,1fr)]">
        <Section title="In the plan">
          <OrderPlan order={order} menu={menu} />
        </Section>
        <div className="grid min-w-0 gap-8">
          <Section title="People">
            <OrderContacts order={order} />
          </Section>
          <Section title="E-mails">
            <OrderMail order={order} menu={menu} />
          </Section>
          <Section title="What happened">
            <OrderEvents order={order} menu={menu} />
          </Section>
        </div>
      </div>
      {act !== null && (
        <OrderActionDialog
          number={order.number}
          act={act}
          menu={menu}
          margin={parts.margin}
          onClose={() => setAct(null)}
        />
      )}
    </div>
  );
}
