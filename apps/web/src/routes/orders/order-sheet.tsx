import { Link } from 'react-router-dom';
import type { Menu } from '#shared/contracts/menu.ts';
import type { OrderView } from '#shared/contracts/orders.ts';
import { formatDay } from '#shared/dates/format.ts';
import { CakeDrawing } from '#web/components/cake-drawing/cake-drawing.tsx';
import { CuttingPlan } from '#web/components/cutting-plan/cutting-plan.tsx';
import { CarriedWeight } from '#web/components/order/carried-weight.tsx';
import { Fold } from '#web/components/ui/fold.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { HeaderSlot } from '#web/components/ui/site-header.tsx';
import { paths } from '#web/config/paths.ts';
import { AddPhoto } from '#web/features/my-order/components/add-photo.tsx';
import { AdviceList } from '#web/features/my-order/components/advice-list.tsx';
import { ChosenList } from '#web/features/my-order/components/chosen-list.tsx';
import { LiftedStops } from '#web/features/my-order/components/lifted-stops.tsx';
import { ContentChanges } from '#web/features/my-order/components/content-changes.tsx';
import { HoldNotice } from '#web/features/my-order/components/hold-notice.tsx';
import { pickupWords } from '#web/components/order/order-times.ts';
import { MadeWith } from '#web/components/order/made-with.tsx';
import { MessageThread } from '#web/features/my-order/components/message-thread.tsx';
import { PhotoRow } from '#web/features/my-order/components/photo-row.tsx';
import { PriceList } from '#web/components/order/price-list.tsx';
import { StageRuler } from '#web/features/my-order/components/stage-ruler.tsx';
import { WithdrawOrder } from '#web/features/my-order/components/withdraw-order.tsx';
import { orderHeadings, stageIndex, stages } from '#web/features/my-order/order-words.ts';
import { CareCardLinks } from './care-card-links.tsx';

type Props = { readonly order: OrderView; readonly menu: Menu };

/** Everything about one order, for its customer. */
export function OrderSheet({ order, menu }: Props) {
  const { studio } = menu;
  const { locale } = studio;
  const reached = stageIndex(order.stage);
  // No warnings, but to be known: what holds a cake up comes out before it is eaten, and alcohol.
  const warned = order.offer.advice.filter(
    (it) =>
      (it.level !== 'ok' || it.code === 'supports' || it.code === 'alcohol') &&
      // What was lifted stands above, with its reason.
      !order.lifted.some((lifted) => lifted.sentence === it.sentence),
  );
  const price = order.agreedPrice ?? order.offer.price;
  return (
    <div className="page grid gap-x-12 gap-y-8 py-8 lg:grid-cols-[minmax(0,5fr)_minmax(0,6fr)]">
      <HeaderSlot>
        <span className="text-slate tabular-nums">No. {order.number}</span>
      </HeaderSlot>
      <header className="grid gap-2 lg:col-span-2">
        <PageTitle title={orderHeadings[order.status]} />
        <Collect order={order} menu={menu} />
      </header>
      {order.ending === null && <ContentChanges order={order} studio={studio} />}
      {order.lifted.length > 0 && order.ending === null && (
        <div className="lg:col-span-2">
          <LiftedStops order={order} studio={studio} />
        </div>
      )}

      <div className="grid content-start gap-5">
        {reached >= 0 && <StageRuler reached={reached} />}
        <Rim label="Your cake" className="p-4 sm:p-6">
          <CakeDrawing
            cake={order.design.cake}
            look={order.design.look}
            menu={menu}
            made={reached < 0 ? 0 : (stages[reached]?.made ?? 1)}
          />
        </Rim>
        {order.ending !== null && (
          <Notice tone={order.status === 'withdrawn' ? 'plain' : 'berry'} title={order.ending}>
            {order.otherDates.length > 0 && (
              <p>
                The nearest days we could keep:{' '}
                {order.otherDates.map((it) => formatDay(it, { locale })).join(', ')}.
              </p>
            )}
            <div>
              <LinkButton to={paths.order} kind="secondary">
                Start another order
              </LinkButton>
            </div>
          </Notice>
        )}
        <HoldNotice order={order} locale={locale} answerHours={studio.answerHours} />
        <Section title={order.agreedPrice === null ? 'The estimate' : 'The price'}>
          <PriceList
            price={price}
            totalLabel={
              order.agreedPrice === null ? 'Estimate, before the baker has looked' : 'Agreed price'
            }
            locale={locale}
          />
        </Section>
      </div>

      <div className="grid content-start gap-9">
        {order.ending === null && (
          <>
            <Section title="When you have it">
              {order.offer.keepCool !== '' && <p className="measure">{order.offer.keepCool}</p>}
              {warned.length > 0 && (
                <AdviceList advice={warned} agreed={order.agreedPrice !== null} />
              )}
            </Section>
            {order.design.cake !== null && (
              <Section title="Carrying and cutting it">
                <CarriedWeight estimate={order.offer} cake={order.design.cake} menu={menu} />
                <Fold label={`How to cut it into ${order.offer.portions.fed} portions`}>
                  <CuttingPlan design={order.design} menu={menu} />
                </Fold>
              </Section>
            )}
            <Section title="Made with">
              <MadeWith
                offer={order.offer}
                region={studio.labelRegion}
                kitchenNotice={studio.kitchenNotice}
              />
            </Section>
          </>
        )}
        {order.careCode !== null && <CareCardLinks code={order.code} careCode={order.careCode} />}
        <Section title="What you asked for">
          <ChosenList order={order} menu={menu} />
        </Section>
        {(order.photos.length > 0 || order.can.addPhotos) && (
          <Section title="Photos">
            {order.photos.length > 0 && <PhotoRow photos={order.photos} />}
            {order.can.addPhotos && <AddPhoto code={order.code} />}
          </Section>
        )}
        <Section title="Messages">
          <MessageThread order={order} studio={studio.name} locale={locale} />
        </Section>
        {order.can.withdraw ? (
          <Section title="Changed your mind?">
            <p className="measure">You can withdraw the order until it is confirmed.</p>
            <div>
              <WithdrawOrder order={order} />
            </div>
          </Section>
        ) : (
          order.status === 'confirmed' && (
            <Section title="Something to change?">
              <p className="measure">
                Write to us above or ring {studio.phone} as early as you can.{' '}
                <Link to={paths.policy('cancellation')} className="link">
                  What a change or cancelling costs
                </Link>
              </p>
            </Section>
          )
        )}
      </div>
    </div>
  );
}

function Collect({ order, menu }: Props) {
  const { studio } = menu;
  const when = pickupWords(order.pickup, studio.locale);
  const where = `${studio.street}, ${studio.town}`;
  if (order.status === 'collected')
    return <p>Collected from us, {where}. We hope it was a good day.</p>;
  if (order.ending !== null) return <p>It was for {when}.</p>;
  return (
    <p className="text-lg">
      {order.status === 'asked' || order.status === 'quoted' ? 'To collect on ' : 'Collect on '}
      <strong>{when}</strong>, {where}.{' '}
      {order.can.seeCalendarFile && (
        <a href={`/api/orders/${encodeURIComponent(order.code)}/calendar.ics`} className="link">
          Add to calendar
        </a>
      )}
    </p>
  );
}
