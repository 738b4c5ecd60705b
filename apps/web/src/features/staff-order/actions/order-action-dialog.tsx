import { useState, type ReactNode } from 'react';
import type { Menu } from '#shared/contracts/menu.ts';
import { statusWords } from '#web/components/order/status-mark.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { Dialog } from '#web/components/ui/dialog.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { useStaffOrder } from '../api/get-staff-order.ts';
import type { ActProps } from './act-props.ts';
import { CollectDialog } from './collect-dialog.tsx';
import { ConfirmDialog } from './confirm-dialog.tsx';
import { DeclineDialog } from './decline-dialog.tsx';
import { MarkDialog } from './mark-dialog.tsx';
import { MoveDialog } from './move-dialog.tsx';
import type { OrderAct } from './order-act.ts';

type Props = {
  readonly number: number;
  readonly act: OrderAct;
  readonly menu: Menu;
  /** Shown with the price where it is about to be confirmed. */
  readonly margin?: ReactNode;
  readonly onClose: () => void;
};

const titles: Readonly<Record<OrderAct, (number: number) => string>> = {
  confirm: (number) => `Confirm No. ${number}`,
  decline: (number) => `Decline No. ${number}`,
  move: (number) => `Move the pickup of No. ${number}`,
  start: (number) => `Start making No. ${number}`,
  ready: (number) => `No. ${number} is ready`,
  collect: (number) => `Hand over No. ${number}`,
  uncollected: (number) => `Nobody came for No. ${number}`,
};

/** One act on one order, from wherever it was asked for; it always works on the order as it is now. */
export function OrderActionDialog({ number, act, menu, margin, onClose }: Props) {
  const { data, isPending, error, refetch } = useStaffOrder(number);
  return (
    <Dialog open onClose={onClose} title={titles[act](number)} wide={act === 'confirm'}>
      {isPending ? (
        <Pending what="Fetching the order…" />
      ) : data === undefined ? (
        <Failure error={error} onRetry={() => void refetch()} />
      ) : (
        <Act
          order={data}
          act={act}
          menu={menu}
          margin={margin}
          onDone={onClose}
          onClose={onClose}
        />
      )}
    </Dialog>
  );
}

function Act({ act, ...props }: ActProps & { readonly act: OrderAct }) {
  // Looked at once: the act's own success takes the right away while the dialog is still closing.
  // Who comes second in the meantime is told so by the refusal.
  const [offered] = useState(act === 'confirm' || props.order.can[act]);
  if (!offered) return <MovedOn {...props} />;
  switch (act) {
    case 'confirm':
      return <ConfirmDialog {...props} />;
    case 'decline':
      return <DeclineDialog {...props} />;
    case 'move':
      return <MoveDialog {...props} />;
    case 'collect':
      return <CollectDialog {...props} />;
    case 'start':
    case 'ready':
    case 'uncollected':
      return <MarkDialog act={act} {...props} />;
  }
}

/** The order stands elsewhere than the page that offered this thought. */
function MovedOn({ order, onClose }: ActProps) {
  return (
    <>
      <Notice tone="butter" title="This cannot be done any more" live="polite">
        <p>
          No. {order.number} is now: {statusWords[order.status]}.
        </p>
      </Notice>
      <div>
        <Button onClick={onClose}>Close</Button>
      </div>
    </>
  );
}
