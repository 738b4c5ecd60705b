import { type ReactNode, useState } from 'react';
import type { StudioCard } from '#shared/contracts/menu.ts';
import { formatDay, formatTime } from '#shared/dates/format.ts';
import { instantWords } from '#web/components/order/order-times.ts';
import { EmptyState } from '#web/components/ui/empty-state.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { paths } from '#web/config/paths.ts';
import { recallSent, type SentOrder } from '../send/sent-order.ts';

type Props = {
  /** Null until the menu is known: the studio's times then go unsaid. */
  readonly studio: StudioCard | null;
};

/** After sending: what has happened, what happens next and when. */
export function SentNotice({ studio }: Props) {
  const [order] = useState(recallSent);
  if (order === null) {
    return (
      <div className="page grid gap-6 py-8">
        <PageTitle title="Your order" />
        <EmptyState
          title="Nothing was sent from this tab lately"
          action={<LinkButton to={paths.order}>Order a cake</LinkButton>}
        >
          <p>If you sent an order, the e-mail we wrote you leads to it.</p>
        </EmptyState>
      </div>
    );
  }
  const link = order.key === null ? '' : `#key=${encodeURIComponent(order.key)}`;
  return (
    <div className="page py-8">
      <Rim className="grid max-w-2xl gap-5 p-6 sm:p-8">
        <PageTitle title={`We have your order, No. ${order.number}`} />
        <p className="text-lg">
          For {formatDay(order.date)}, to collect from {formatTime(order.windowStart)}.
        </p>
        {order.earlierTry && (
          <Notice tone="butter" title="Your earlier try had arrived after all">
            <p>
              So this is that order. What you changed since then is not in it: write to us on the
              order’s page, and we change it.
            </p>
          </Notice>
        )}
        <ol className="grid gap-4">
          <NextSteps order={order} studio={studio} />
        </ol>
        <div>
          <LinkButton to={`${paths.myOrder(order.code)}${link}`}>Open your order</LinkButton>
        </div>
      </Rim>
    </div>
  );
}

function NextSteps({ order, studio }: Props & { readonly order: SentOrder }) {
  const within = studio === null ? 'soon' : `within ${studio.answerHours} hours`;
  const { hold } = order;
  return (
    <>
      {hold?.needsLink === true && (
        <Step at={1} title="Open the e-mail now">
          We wrote to {order.email}.{' '}
          {studio === null
            ? 'Your day is kept for a short while; '
            : `Your day is kept for ${studio.guestHoldMinutes} minutes, until ${instantWords(hold.expiresAt, studio.zone, studio.locale)}; `}
          opening the link in the e-mail keeps it until the baker has answered.
        </Step>
      )}
      {hold !== null && !hold.needsLink && (
        <Step at={1} title="Your day is kept">
          A place at the bench is yours until the baker has answered. We wrote to {order.email}.
        </Step>
      )}
      {hold === null && (
        <Step at={1} title="No day is kept yet">
          The baker looks whether your day can be done. We wrote to {order.email}.
        </Step>
      )}
      <Step at={2} title="The baker reads it">
        You get an answer {within}: yes with a price, or a question, or the nearest days that can be
        done. What you told us of allergies is read first, and talked over with you wherever it
        needs it, before anything is promised.
      </Step>
      <Step at={3} title="Nothing is to be paid before you agree">
        Follow your order, write to us or take it back on its own page.
      </Step>
    </>
  );
}

type StepProps = { readonly at: number; readonly title: string; readonly children: ReactNode };

function Step({ at, title, children }: StepProps) {
  return (
    <li className="grid grid-cols-[auto_1fr] gap-4">
      <span
        aria-hidden="true"
        className="grid size-9 place-items-center rounded-action bg-butter-tint font-display text-lg font-bold tabular-nums"
      >
        {at}
      </span>
      <div>
        <h2 className="text-lg">{title}</h2>
        <p className="text-slate">{children}</p>
      </div>
    </li>
  );
}
