import type { StaffOrder } from '#shared/contracts/staff.ts';
import { Button } from '#web/components/ui/button.tsx';
import { DialogActions } from '#web/components/ui/dialog-actions.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { useMarkUncollected } from '../api/mark-uncollected.ts';
import { useReadyOrder } from '../api/ready-order.ts';
import { useStartOrder } from '../api/start-order.ts';
import { ActFailure } from './act-failure.tsx';
import type { ActProps } from './act-props.ts';

type Mark = 'start' | 'ready' | 'uncollected';

type Words = {
  readonly says: (customer: string) => string;
  readonly press: string;
  readonly done: (order: StaffOrder, customer: string) => string;
};

const words: Readonly<Record<Mark, Words>> = {
  start: {
    says: (customer) =>
      `Work on it begins. ${customer} sees “in the kitchen” on the order’s page; no e-mail goes out.`,
    press: 'It is in the making',
    done: (order) => `No. ${order.number} is in the making.`,
  },
  ready: {
    says: (customer) =>
      `The cake stands boxed and cold. ${customer} gets an e-mail that it is ready to collect.`,
    press: 'It is ready, tell them',
    done: (order, customer) => `No. ${order.number} is ready; ${customer} is told by e-mail.`,
  },
  uncollected: {
    says: (customer) =>
      `The pickup window has passed and nobody came. No e-mail goes out; write to ${customer} or ring first if you can.`,
    press: 'Nobody came for it',
    done: (order) => `No. ${order.number} is noted as not collected.`,
  },
};

/** An act that is only pressed, said in words first because it cannot be taken back. */
export function MarkDialog({ act, order, onDone, onClose }: ActProps & { readonly act: Mark }) {
  const acts = {
    start: useStartOrder(order.number),
    ready: useReadyOrder(order.number),
    uncollected: useMarkUncollected(order.number),
  };
  const { mutate, isPending, error } = acts[act];
  const toast = useToast();
  const customer = order.contacts.find((it) => it.as === 'ordered')?.name ?? 'The customer';
  return (
    <>
      <ActFailure error={error} />
      <p>{words[act].says(customer)}</p>
      <DialogActions>
        <Button
          pending={isPending}
          onClick={() =>
            mutate(
              { rowVersion: order.rowVersion },
              {
                onSuccess: (done) => {
                  toast({ message: words[act].done(done, customer) });
                  onDone();
                },
              },
            )
          }
        >
          {words[act].press}
        </Button>
        <Button kind="quiet" onClick={onClose}>
          Not yet
        </Button>
      </DialogActions>
    </>
  );
}
