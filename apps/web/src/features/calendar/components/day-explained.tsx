import { Link } from 'react-router-dom';
import { type CalendarDay, type WaitingRequest, blockDay } from '#shared/contracts/staff.ts';
import { formatDay, formatList, formatWindow } from '#shared/dates/format.ts';
import * as z from 'zod/mini';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { Unfold } from '#web/components/ui/unfold.tsx';
import { paths } from '#web/config/paths.ts';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useBlockDay } from '../api/block-day.ts';
import { useOpenDay } from '../api/open-day.ts';
import { dayWords, loadOf } from '../days/day-load.ts';

type Props = {
  readonly day: CalendarDay;
  readonly waiting: readonly WaitingRequest[];
  readonly mayBlock: boolean;
  readonly locale: string;
  /** The day's own page leaves out the way to itself. */
  readonly onItsOwn?: boolean;
};

/** Why a day is as full as it is, who is at the bench, and closing or opening it. */
export function DayExplained({ day, waiting, mayBlock, locale, onItsOwn = false }: Props) {
  const load = loadOf(day);
  const own = waiting.filter((it) => it.pickup.date === day.date);
  const words = dayWords(day, own.length);
  return (
    <div className="grid gap-3">
      <div role="status" className="grid gap-1.5">
        <p>
          {!onItsOwn && <strong>{formatDay(day.date, { locale })}: </strong>}
          <span className={load === 'overfull' ? 'font-semibold text-berry' : undefined}>
            {words === '' ? 'nothing planned' : words}.
          </span>
          {day.closed !== null && ` ${day.closed.reason}.`}
        </p>
        {day.why.length > 0 && (
          <p>
            <span className="text-slate">At the bench: </span>
            {day.why.join(', ')}.
          </p>
        )}
        {!onItsOwn && day.shifts.length > 0 && (
          <p className="text-slate">
            {day.shifts
              .map((it) => `${formatWindow(it.start, it.end - it.start)} ${formatList(it.people)}`)
              .join('; ')}
            .
          </p>
        )}
        {own.length > 0 && (
          <p>
            <span className="text-slate">Waiting: </span>
            {own.map((it, at) => (
              <span key={it.number}>
                {at > 0 && ', '}
                <Link to={paths.staffOrder(it.number)} className="link">
                  No. {it.number}
                </Link>
              </span>
            ))}
          </p>
        )}
      </div>
      <div className="flex flex-wrap items-start gap-3">
        {!onItsOwn && (
          <Link
            to={paths.staffCalendarAt('day', day.date)}
            className="link inline-flex min-h-11 items-center"
          >
            The whole day
          </Link>
        )}
        {mayBlock && <BlockOrOpen key={day.date} day={day} locale={locale} />}
      </div>
    </div>
  );
}

const blockForm = z.pick(blockDay, { reason: true });

type BlockProps = Pick<Props, 'day' | 'locale'>;

/** Closes a day for new orders, or opens it again; what stands on it stays. */
function BlockOrOpen(props: BlockProps) {
  const { closed } = props.day;
  if (closed === null) {
    return (
      <Unfold label="Block this day">{(fold) => <BlockForm {...props} onFold={fold} />}</Unfold>
    );
  }
  // Where its weekday is not one of the studio's there is nothing to open.
  return closed.id === null ? null : <OpenAgain {...props} closureId={closed.id} />;
}

function OpenAgain({ day, locale, closureId }: BlockProps & { readonly closureId: string }) {
  const open = useOpenDay();
  const toast = useToast();
  return (
    <div className="grid gap-3">
      {open.isError && <Failure error={open.error} />}
      <Button
        kind="secondary"
        pending={open.isPending}
        onClick={() =>
          open.mutate(closureId, {
            onSuccess: () =>
              toast({ message: `${formatDay(day.date, { locale })} is open again.` }),
          })
        }
      >
        Open it again
      </Button>
    </div>
  );
}

function BlockForm({ day, locale, onFold }: BlockProps & { readonly onFold: () => void }) {
  const { form, failure, submit } = useContractForm(blockForm, { reason: '' });
  const block = useBlockDay();
  const open = useOpenDay();
  const toast = useToast();
  const name = formatDay(day.date, { locale });
  return (
    <form
      noValidate
      className="grid w-full gap-3 *:max-w-md"
      onSubmit={submit(async ({ reason }) => {
        const { id, standing } = await block.mutateAsync({ date: day.date, reason });
        toast({
          message: `${name} takes no new orders. ${standingWords(standing)}`,
          onUndo: () => open.mutate(id),
        });
      })}
    >
      <FormProblems form={form} failure={failure} />
      <TextField
        {...form.register('reason')}
        label={`Why ${name} is blocked`}
        hint="For the team. Orders that stand on that day stay; you see which."
        autoComplete="off"
        error={errorOf(form.formState.errors, 'reason')}
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" pending={block.isPending}>
          Block it
        </Button>
        <Button kind="quiet" onClick={onFold}>
          Leave it open
        </Button>
      </div>
    </form>
  );
}

function standingWords(standing: readonly number[]): string {
  if (standing.length === 0) return 'No order stands on it.';
  return `These stay on it: ${formatList(standing.map((it) => `No. ${it}`))}.`;
}
