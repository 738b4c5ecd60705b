import { useEffect, useRef } from 'react';
import { Link } from 'react-router-dom';
import { formatMoney } from '#shared/kitchen/money.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { paths } from '#web/config/paths.ts';
import { fieldId } from '#web/lib/forms.ts';
import { type SendRefusal, stepOfIssue } from '../../send/refusal.ts';
import type { Sending } from '../../send/use-send.ts';
import { fromCheck } from '../../steps/use-step.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { DateGone } from './date-gone.tsx';

/** Why the order was not taken, what is kept, and what to do about it. */
export function SendRefusalNotice({ sending }: { readonly sending: Sending }) {
  const { refusal } = sending;
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (refusal !== null) {
      box.current?.focus();
      box.current?.scrollIntoView({ block: 'center' });
    }
  }, [refusal]);
  if (refusal === null) return null;
  return (
    <div ref={box} tabIndex={-1}>
      <Refusal refusal={refusal} sending={sending} />
    </div>
  );
}

type Props = { readonly refusal: SendRefusal; readonly sending: Sending };

function Refusal({ refusal, sending }: Props) {
  const { menu, queue } = useWizard();
  switch (refusal.kind) {
    case 'lost':
      return (
        <Notice tone="butter" live="assertive" title="We could not tell whether it arrived">
          <p>
            The connection was lost. Everything is kept on this device; press Send again when you
            are back. However often you press, it is one order.
          </p>
        </Notice>
      );
    case 'date-gone':
      return <DateGone refusal={refusal} onChosen={sending.settle} />;
    case 'price-changed': {
      const { price } = refusal.estimate;
      const money = (amount: number) => formatMoney(amount, price.currency, menu.studio.locale);
      return (
        <Notice tone="butter" live="assertive" title="The price has changed meanwhile">
          <p>
            {refusal.seenMinor !== null && `You saw ${money(refusal.seenMinor)}. `}
            It is now <strong>{money(price.totalMinor)}</strong>; the lines above show it. If it
            suits you, send it again.
          </p>
        </Notice>
      );
    }
    case 'answers':
      return (
        <Notice tone="berry" live="assertive" title="Some answers need another look">
          <ul className="grid">
            {refusal.issues.map((issue) => (
              <li key={`${issue.path} ${issue.message}`}>
                <Link
                  to={`${paths.orderStep(stepOfIssue(issue))}#${fieldId(issue.path)}`}
                  state={fromCheck}
                  className="link inline-flex min-h-11 items-center"
                >
                  {issue.message}
                </Link>
              </li>
            ))}
          </ul>
        </Notice>
      );
    case 'photos-under-way':
      return (
        <Notice tone="butter" live="assertive" title="Not all your pictures have arrived yet">
          <p>Wait a moment and press Send again, or leave out those that are still on their way.</p>
          <div className="flex flex-wrap gap-3">
            <Link
              to={paths.orderStep('look')}
              state={fromCheck}
              className="link inline-flex min-h-11 items-center"
            >
              See how far they are
            </Link>
            <Button
              kind="secondary"
              onClick={() => {
                queue.clear();
                sending.settle();
              }}
            >
              Leave them out
            </Button>
          </div>
        </Notice>
      );
    case 'sign-in':
      return (
        <Notice tone="butter" live="assertive" title={refusal.title}>
          <p>Your answers are kept on this device.</p>
          <Link
            to={paths.signInThen(paths.orderStep('check'))}
            className="link inline-flex min-h-11 items-center"
          >
            Sign in and come back here
          </Link>
        </Notice>
      );
    case 'other':
      return (
        <Notice tone="berry" live="assertive" title={refusal.title}>
          {refusal.detail !== '' && <p>{refusal.detail}</p>}
          <p>Nothing was sent; everything is kept on this device.</p>
        </Notice>
      );
  }
}
