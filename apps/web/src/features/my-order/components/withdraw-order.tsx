import { useState } from 'react';
import type { OrderView } from '#shared/contracts/orders.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Dialog } from '#web/components/ui/dialog.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { useWithdrawOrder } from '../api/withdraw-order.ts';

/** Withdrawing cannot be undone, so it is confirmed in words. */
export function WithdrawOrder({ order }: { readonly order: OrderView }) {
  const [asking, setAsking] = useState(false);
  const [reason, setReason] = useState('');
  const withdraw = useWithdrawOrder(order.code);
  return (
    <>
      <Button kind="danger" onClick={() => setAsking(true)}>
        Withdraw this order
      </Button>
      <Dialog
        open={asking}
        onClose={() => setAsking(false)}
        title={`Withdraw order No. ${order.number}?`}
      >
        <p>
          Your place in our plan is given up at once and somebody else may take it. This cannot be
          undone; you can always send a new order.
        </p>
        {withdraw.isError && <Failure error={withdraw.error} />}
        <TextArea
          label="Why, in a word"
          optional
          rows={2}
          maxLength={500}
          value={reason}
          onChange={(event) => setReason(event.target.value)}
        />
        <div className="flex flex-wrap gap-3">
          <Button
            kind="danger"
            pending={withdraw.isPending}
            onClick={() =>
              withdraw.mutate(
                { rowVersion: order.rowVersion, reason },
                { onSuccess: () => setAsking(false) },
              )
            }
          >
            Yes, withdraw it
          </Button>
          <Button kind="secondary" onClick={() => setAsking(false)}>
            Keep my order
          </Button>
        </div>
      </Dialog>
    </>
  );
}
