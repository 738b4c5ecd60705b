import { Link } from 'react-router-dom';
import type { WaitingRequest } from '#shared/contracts/staff.ts';
import { formatDay, formatTime } from '#shared/dates/format.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { AdviceNote } from '#web/components/order/advice-note.tsx';
import { plainly } from '#web/components/order/plainly.ts';
import { FitLine } from '#web/components/order/fit-line.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { VisuallyHidden } from '#web/components/ui/visually-hidden.tsx';
import { paths } from '#web/config/paths.ts';

type Props = {
  readonly waiting: readonly WaitingRequest[];
  readonly locale: string;
  readonly onAct: (number: number, act: 'confirm' | 'decline') => void;
};

/** What the studio has not answered yet, each with its sharpest advice and whether it fits. */
export function WaitingColumn({ waiting, locale, onAct }: Props) {
  return (
    <section id="waiting" aria-labelledby="waiting-title" className="grid content-start">
      <h2 id="waiting-title" tabIndex={-1}>
        Waiting for you
      </h2>
      {waiting.length === 0 ? (
        <p className="py-3 text-slate">Nobody waits for an answer.</p>
      ) : (
        <ul className="divide-y divide-seam">
          {waiting.map((it) => (
            <li key={it.number} className="py-4">
              <Request request={it} locale={locale} onAct={onAct} />
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

type RequestProps = Pick<Props, 'locale' | 'onAct'> & { readonly request: WaitingRequest };

function Request({ request, locale, onAct }: RequestProps) {
  const { number, pickup, advice, fits, can } = request;
  // What stops it, or has no place, is settled on its page; confirming would only say so.
  const stopped = advice?.level === 'stop';
  const confirms = can.confirm && !stopped && fits.fits;
  const whose = <VisuallyHidden> No. {number}</VisuallyHidden>;
  return (
    <div className="grid gap-2">
      <h3 className="text-base">
        <Link
          to={paths.staffOrder(number)}
          className="inline-block py-0.5 text-ink underline decoration-transparent underline-offset-3 hover:decoration-current"
        >
          <span className="tabular-nums">{number}</span>, {formatDay(pickup.date, { locale })},{' '}
          <span className="tabular-nums">{formatTime(pickup.start)}</span>
        </Link>
      </h3>
      <p className="text-sm text-slate">
        {request.customer}. {request.summary}.{' '}
        <span className="font-semibold text-ink tabular-nums">
          {formatMoney(request.totalMinor, request.currency, locale)}
        </span>
      </p>
      {advice !== null && advice.level !== 'ok' && (
        <AdviceNote advice={{ ...plainly(advice), instead: '' }} small />
      )}
      <FitLine fits={fits} />
      <div className="flex flex-wrap gap-2 pt-1">
        {confirms && <Button onClick={() => onAct(number, 'confirm')}>Confirm{whose}</Button>}
        <LinkButton
          to={`${paths.staffOrder(number)}${stopped ? '#settle' : ''}`}
          kind={confirms ? 'quiet' : 'primary'}
        >
          {stopped ? 'Open and settle' : 'Open'}
          {whose}
        </LinkButton>
        {can.decline && (
          <Button kind="quiet" onClick={() => onAct(number, 'decline')}>
            Decline{whose}
          </Button>
        )}
      </div>
    </div>
  );
}
