import * as z from 'zod/mini';
import { declineOrder } from '#shared/contracts/staff.ts';
import { formatDay, formatList } from '#shared/dates/format.ts';
import { addDays, today } from '#shared/dates/local-time.ts';
import type { DayAnswer } from '#shared/contracts/dates.ts';
import { Button } from '#web/components/ui/button.tsx';
import { DialogActions } from '#web/components/ui/dialog-actions.tsx';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { FormErrorSummary } from '#web/components/ui/form-error-summary.tsx';
import { errorOf } from '#web/components/ui/form-problems.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { listFieldProblems } from '#web/lib/forms.ts';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useDeclineOrder } from '../api/decline-order.ts';
import { useOrderDates } from '../api/get-order-dates.ts';
import { ActFailure } from './act-failure.tsx';
import type { ActProps } from './act-props.ts';

const declineForm = z.omit(declineOrder, { rowVersion: true });

/** No, with a reason the customer reads, and the nearest days the bench could keep. */
export function DeclineDialog({ order, menu, onDone, onClose }: ActProps) {
  const { form, failure, submit } = useContractForm(declineForm, { reason: '', offerDates: true });
  const decline = useDeclineOrder(order.number);
  const toast = useToast();
  const { errors, submitCount } = form.formState;
  const customer = order.contacts.find((it) => it.as === 'ordered')?.name ?? 'The customer';

  return (
    <form
      noValidate
      className="grid gap-5"
      onSubmit={submit(async (values) => {
        await decline.mutateAsync({ ...values, rowVersion: order.rowVersion });
        toast({ message: `No. ${order.number} is declined; ${customer} is told by e-mail.` });
        onDone();
      })}
    >
      <FormErrorSummary problems={listFieldProblems(errors)} attempt={submitCount} />
      <ActFailure error={failure} />
      <TextArea
        {...form.register('reason')}
        label="Why"
        hint={`${customer} reads this word for word.`}
        error={errorOf(errors, 'reason')}
      />
      <Checkbox
        {...form.register('offerDates')}
        label="Offer the nearest days the bench could keep"
        hint={<NearestDays order={order} menu={menu} />}
      />
      <p>This cannot be taken back. The place in the plan becomes free at once.</p>
      <DialogActions>
        <Button type="submit" kind="danger" pending={decline.isPending}>
          Decline and tell them
        </Button>
        <Button kind="quiet" onClick={onClose}>
          Not yet
        </Button>
      </DialogActions>
    </form>
  );
}

/** Days around the one that was asked for that would have been kept. */
function NearestDays({ order, menu }: Pick<ActProps, 'order' | 'menu'>) {
  const now = today(new Date(), menu.studio.zone);
  const asked = order.pickup.date < now ? now : order.pickup.date;
  const earliest = addDays(asked, -14);
  const { data, isPending, isError } = useOrderDates(
    order.number,
    order.design,
    earliest < now ? now : earliest,
    addDays(asked, 21),
  );
  if (isPending) return 'Looking for them…';
  if (isError || data === undefined)
    return 'We cannot look them up just now; the e-mail still offers them.';
  const nearest = nearestOpen(data.days, order.pickup.date, 3);
  if (nearest.length === 0) return 'There are none within three weeks of that day.';
  return `${formatList(nearest.map((it) => formatDay(it, { locale: menu.studio.locale })))}.`;
}

/** So many open days nearest to one day, in their own order. */
export function nearestOpen(days: readonly DayAnswer[], to: string, count: number): string[] {
  const away = (date: string) => Math.abs(Date.parse(date) - Date.parse(to));
  return days
    .filter((it) => it.date !== to && (it.answer === 'open' || it.answer === 'last-place'))
    .map((it) => it.date)
    .toSorted((a, b) => away(a) - away(b))
    .slice(0, count)
    .toSorted();
}
