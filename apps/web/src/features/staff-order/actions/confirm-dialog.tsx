import { useId, useState } from 'react';
import { Link } from 'react-router-dom';
import type { Advice } from '#shared/contracts/estimates.ts';
import { FitLine } from '#web/components/order/fit-line.tsx';
import { AdviceNote } from '#web/components/order/advice-note.tsx';
import { allergyWords } from '#web/components/order/allergy-words.ts';
import { plainly } from '#web/components/order/plainly.ts';
import { pickupWords } from '#web/components/order/order-times.ts';
import { PriceList } from '#web/components/order/price-list.tsx';
import { statusWords } from '#web/components/order/status-mark.tsx';
import { MailPreview } from '#web/components/mail-preview/mail-preview.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { DialogActions } from '#web/components/ui/dialog-actions.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { paths } from '#web/config/paths.ts';
import { useConfirmOrder } from '../api/confirm-order.ts';
import { useConfirmation } from '../api/get-confirmation.ts';
import { ActFailure } from './act-failure.tsx';
import type { ActProps } from './act-props.ts';

/** The last look: what it costs and the e-mail as it will go; then one press. */
export function ConfirmDialog({ order, menu, margin, onDone, onClose }: ActProps) {
  const [note, setNote] = useState('');
  const [shownNote, setShownNote] = useState('');
  const look = useConfirmation(order.number, shownNote);
  const confirm = useConfirmOrder(order.number);
  const toast = useToast();
  const heading = useId();

  if (look.isPending) return <Pending what="Writing the e-mail to look at…" />;
  if (look.data === undefined) {
    return <Failure error={look.error} onRetry={() => void look.refetch()} />;
  }
  const { price, email, blockers, fits, rowVersion } = look.data;
  // Once it is under way the order itself says no more confirming; that is no news.
  const pressed = confirm.isPending || confirm.isSuccess;
  const blocked = !pressed && (blockers.length > 0 || !order.can.confirm);
  // A stop that was lifted, or answered, stays one to have in sight.
  const settled = order.estimate.advice.filter(
    (it) =>
      it.level === 'stop' &&
      !blockers.some((other) => other.code === it.code && other.about === it.about),
  );
  const reasonFor = (it: Advice) =>
    order.lifted.find((other) => other.code === it.code && other.about === it.about)?.reason ??
    answerTo(it, order);
  const noteWaits = note.trim() !== shownNote;

  return (
    <>
      <ActFailure error={confirm.error} />
      <div className="grid items-start gap-x-8 gap-y-5 md:grid-cols-[minmax(0,0.8fr)_minmax(0,1fr)]">
        <div className="grid gap-5">
          <div className="grid gap-2">
            <p className="font-semibold">{pickupWords(order.pickup, menu.studio.locale)}</p>
            <FitLine fits={fits} />
            {!fits.fits && (
              <p className="text-sm text-slate">
                Confirming asks the plan once more. Where it finds no place it says so, and nothing
                is sent; then move the pickup to a day that fits.
              </p>
            )}
          </div>
          {blockers.length > 0 && <Blocked order={order} blockers={blockers} onClose={onClose} />}
          {blocked && blockers.length === 0 && (
            <Notice tone="butter" title="It cannot be confirmed just now" live="polite">
              <p>
                {order.status === 'asked' && !fits.fits
                  ? 'It has no place in the plan. Move the pickup to a day that fits first.'
                  : `No. ${order.number} is now: ${statusWords[order.status]}.`}
              </p>
            </Notice>
          )}
          {settled.map((it) => (
            <AdviceNote
              key={`${it.code} ${it.about}`}
              advice={{ ...plainly(it), instead: reasonFor(it) }}
            />
          ))}
          {order.allergies.length > 0 && (
            <div className="grid gap-1">
              <h3>Told about guests</h3>
              <ul className="grid gap-1 text-sm">
                {order.allergies.map((it) => (
                  <li key={it.id}>
                    <span className="font-semibold text-berry">
                      {allergyWords(it, menu.studio.labelRegion)}
                    </span>
                    {it.answer === null ? '. No talk is recorded.' : '. The talk is recorded.'}
                  </li>
                ))}
              </ul>
            </div>
          )}
          <PriceList price={price} totalLabel="They pay" locale={menu.studio.locale} />
          {margin}
        </div>
        <section aria-labelledby={heading} className="grid min-w-0 gap-3">
          <h3 id={heading}>The e-mail that goes out</h3>
          <TextArea
            label="A word of yours in it"
            optional
            rows={2}
            value={note}
            maxLength={1000}
            onChange={(event) => setNote(event.target.value)}
            onBlur={() => setShownNote(note.trim())}
          />
          <dl className="grid grid-cols-[auto_1fr] gap-x-3 text-sm">
            <dt className="text-slate">To</dt>
            <dd className="min-w-0 break-words">{email.to}</dd>
            <dt className="text-slate">Subject</dt>
            <dd className="min-w-0">{email.subject}</dd>
          </dl>
          <MailPreview html={email.html} text={email.text} title={`The e-mail to ${email.to}`} />
          <p role="status" className="text-sm text-slate empty:hidden">
            {look.isFetching
              ? 'Writing it again…'
              : noteWaits
                ? 'Your words appear in it once you leave the field.'
                : ''}
          </p>
        </section>
      </div>
      <DialogActions>
        {blocked ? (
          <Button kind="secondary" onClick={onClose}>
            Close
          </Button>
        ) : (
          <>
            <Button
              pending={confirm.isPending}
              onClick={() => {
                confirm.mutate(
                  { rowVersion, ...(note.trim() === '' ? {} : { note: note.trim() }) },
                  {
                    onSuccess: (done) => {
                      toast({
                        message:
                          done.status === 'agreed'
                            ? `No. ${done.number} is agreed and waits for the deposit. The e-mail is on its way to ${email.to}.`
                            : `No. ${done.number} is confirmed. The e-mail is on its way to ${email.to}.`,
                      });
                      onDone();
                    },
                  },
                );
              }}
            >
              Confirm and send it
            </Button>
            <Button kind="quiet" onClick={onClose}>
              Not yet
            </Button>
          </>
        )}
      </DialogActions>
    </>
  );
}

/** What was settled about an allergy told in words; nothing for any other advice. */
function answerTo({ code, about }: Advice, { allergies }: ActProps['order']): string {
  if (code !== 'allergy-text') return '';
  const told = allergies.find((it) => about === `allergy-text:${it.text.trim()}`);
  const answer = told?.answer ?? null;
  return answer === null ? '' : `Settled: ${answer.text} (${answer.by})`;
}

type BlockedProps = Pick<ActProps, 'order' | 'onClose'> & {
  readonly blockers: ActProps['order']['blockers'];
};

/** What must be settled first, and where to do it. */
function Blocked({ order, blockers, onClose }: BlockedProps) {
  return (
    <div
      role="alert"
      className="grid gap-3 rounded-action border-2 border-berry bg-berry-tint px-4 py-3"
    >
      <h3>Settle this first</h3>
      <ul className="grid gap-3">
        {blockers.map((it) => (
          <li key={`${it.code} ${it.about}`}>
            <AdviceNote
              advice={{
                ...plainly(it),
                instead:
                  it.waitsFor === 'customer'
                    ? 'You have given your reason; the customer has still to read and accept it.'
                    : '',
              }}
            />
          </li>
        ))}
      </ul>
      <p>
        <Link
          to={`${paths.staffOrder(order.number)}#settle`}
          onClick={onClose}
          className="link inline-block py-1"
        >
          Settle it on the order’s page
        </Link>
      </p>
    </div>
  );
}
