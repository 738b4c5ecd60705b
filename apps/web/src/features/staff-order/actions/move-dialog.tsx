import { useState } from 'react';
import * as z from 'zod/mini';
import { moveOrder } from '#shared/contracts/staff.ts';
import { formatDay, formatWindow } from '#shared/dates/format.ts';
import { Button } from '#web/components/ui/button.tsx';
import { DialogActions } from '#web/components/ui/dialog-actions.tsx';
import { FormErrorSummary } from '#web/components/ui/form-error-summary.tsx';
import { errorOf } from '#web/components/ui/form-problems.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { pickupWords } from '#web/components/order/order-times.ts';
import { listFieldProblems } from '#web/lib/forms.ts';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useMoveOrder } from '../api/move-order.ts';
import { ActFailure } from './act-failure.tsx';
import type { ActProps } from './act-props.ts';
import { PickupChoice } from './pickup-choice.tsx';

const moveForm = z.omit(moveOrder, { rowVersion: true });

/** Another day and window, out of what the bench could keep; the customer is told. */
export function MoveDialog({ order, menu, onDone, onClose }: ActProps) {
  const { locale } = menu.studio;
  const { form, failure, submit } = useContractForm(moveForm, {
    date: order.pickup.date,
    windowStart: order.pickup.start,
    note: '',
  });
  const [chosen, setChosen] = useState({ date: order.pickup.date, start: order.pickup.start });
  const [unmoved, setUnmoved] = useState(false);
  const move = useMoveOrder(order.number);
  const toast = useToast();
  const { errors, submitCount } = form.formState;
  const same = chosen.date === order.pickup.date && chosen.start === order.pickup.start;
  const problems = [
    ...listFieldProblems(errors),
    ...(unmoved && same ? [{ name: 'date', message: 'Choose another day or window.' }] : []),
  ];

  return (
    <form
      noValidate
      className="grid gap-5"
      onSubmit={(event) => {
        if (same) {
          event.preventDefault();
          setUnmoved(true);
          return;
        }
        submit(async (values) => {
          const moved = await move.mutateAsync({ ...values, rowVersion: order.rowVersion });
          toast({
            message: `No. ${order.number} is now for ${pickupWords(moved.pickup, locale)}; the customer is told by e-mail.`,
          });
          onDone();
        })(event);
      }}
    >
      <FormErrorSummary problems={problems} attempt={submitCount + (unmoved ? 1 : 0)} />
      <ActFailure error={failure} />
      <p>
        Now: <strong>{pickupWords(order.pickup, locale)}</strong>
      </p>
      <PickupChoice
        order={order}
        studio={menu.studio}
        chosen={chosen}
        error={errorOf(errors, 'date') ?? errorOf(errors, 'windowStart')}
        onChosen={(next) => {
          setChosen(next);
          form.setValue('date', next.date);
          form.setValue('windowStart', next.start);
        }}
      />
      <TextArea
        {...form.register('note')}
        label="A word to the customer"
        hint="Goes into the e-mail about the new day."
        optional
        rows={3}
        error={errorOf(errors, 'note')}
      />
      <DialogActions>
        <Button type="submit" pending={move.isPending}>
          Move it and tell them
        </Button>
        <Button kind="quiet" onClick={onClose}>
          Not yet
        </Button>
        <p role="status" className="text-sm text-slate">
          {same
            ? ''
            : `To ${formatDay(chosen.date, { locale })}, ${formatWindow(chosen.start, order.pickup.minutes)}`}
        </p>
      </DialogActions>
    </form>
  );
}
