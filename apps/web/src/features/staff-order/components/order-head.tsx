import type { ReactNode } from 'react';
import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { FitLine } from '#web/components/order/fit-line.tsx';
import { instantWords, pickupWords } from '#web/components/order/order-times.ts';
import { StatusMark } from '#web/components/order/status-mark.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { type OrderAct, actWords, orderActs } from '../actions/order-act.ts';

type Props = {
  readonly order: StaffOrder;
  readonly menu: Menu;
  readonly onAct: (act: OrderAct) => void;
};

/** Who, when, where it stands, and what may be done about it. */
export function OrderHead({ order, menu, onAct }: Props) {
  const { locale, zone } = menu.studio;
  const customer = order.contacts.find((it) => it.as === 'ordered')?.name ?? '';
  const occasion = menu.occasions.find((it) => it.id === order.design.guests.occasionId)?.name;
  const acts = orderActs.filter((it) => order.can[it]);
  const waits = order.status === 'asked' || order.status === 'quoted' || order.status === 'agreed';
  return (
    <div className="grid gap-4">
      <div className="grid gap-1.5">
        <PageTitle title={`No. ${order.number}`}>
          <span className="tabular-nums">No. {order.number}</span>
          {customer !== '' && `, ${customer}`}
        </PageTitle>
        <p className="flex flex-wrap items-center gap-x-5 gap-y-1">
          <StatusMark status={order.status} long />
          <strong>{pickupWords(order.pickup, locale)}</strong>
          <span className="text-slate">
            {order.design.guests.headCount} people
            {occasion !== undefined && `, ${occasion.toLowerCase()}`}
          </span>
        </p>
      </div>
      {(waits || order.hold !== null) && (
        <div className="grid gap-1.5">
          {waits && <FitLine fits={order.fits} />}
          {order.hold !== null && (
            <Hold>
              Its place in the plan is kept until{' '}
              <strong>{instantWords(order.hold.expiresAt, zone, locale)}</strong>
              {order.hold.needsLink
                ? '; longer once the customer opens the link in their e-mail.'
                : '.'}
            </Hold>
          )}
        </div>
      )}
      {acts.length > 0 && (
        <div data-print="no" className="flex flex-wrap gap-3">
          {acts.map((act, at) => (
            <Button
              key={act}
              kind={
                act === 'decline' || act === 'uncollected'
                  ? 'danger'
                  : at === 0 && act !== 'move'
                    ? 'primary'
                    : 'secondary'
              }
              onClick={() => onAct(act)}
            >
              {actWords[act]}
            </Button>
          ))}
        </div>
      )}
      {acts.length === 0 && order.can.write === false && (
        <p className="text-slate">There is nothing left to do on this order.</p>
      )}
    </div>
  );
}

function Hold({ children }: { readonly children: ReactNode }) {
  return (
    <p className="flex gap-2 text-sm">
      <svg viewBox="0 0 20 20" className="size-5 shrink-0 text-cobalt" aria-hidden="true">
        <path
          d="M4 2h12M4 18h12M5.5 2c0 5 9 5 9 8s-9 3-9 8M14.5 2c0 5-9 5-9 8s9 3 9 8"
          fill="none"
          stroke="currentColor"
          strokeWidth="1.6"
          strokeLinecap="round"
        />
      </svg>
      <span>{children}</span>
    </p>
  );
}
