import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { Link } from 'react-router-dom';
import { formatMoney } from '#shared/kitchen/money.ts';
import { MadeWith } from '#web/components/order/made-with.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { paths } from '#web/config/paths.ts';
import { estimateQuery } from '../../api/get-estimate.ts';
import { useSend } from '../../send/use-send.ts';
import { steps } from '../../steps/steps.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { BottomBar } from '../frame/bottom-bar.tsx';
import { DateWatch } from '../frame/date-watch.tsx';
import { CheckAdvice } from './check-advice.tsx';
import { CheckAnswers } from './check-answers.tsx';
import { FinalPrice } from './final-price.tsx';
import { HowItIsCut } from './how-it-is-cut.tsx';
import { SendRefusalNotice } from './send-refusal-notice.tsx';

/** Everything once more, each with a way back to it; the studio's own price; then send. */
export function CheckStep() {
  const { menu, values, design, running, reach } = useWizard();
  const { day, askWithoutDate } = values;
  const server = useQuery({
    ...estimateQuery(design, day.date),
    // While the same design is asked for again, the last word stays.
    placeholderData: (before) => before,
  });
  const sending = useSend();
  const estimate = sending.agreed ?? server.data ?? running.estimate;
  const total =
    estimate === null
      ? null
      : formatMoney(estimate.price.totalMinor, estimate.price.currency, menu.studio.locale);

  useEffect(() => reach('check'), [reach]);

  return (
    <form
      noValidate
      className="grid min-w-0 gap-8"
      onSubmit={(event) => {
        event.preventDefault();
        sending.send(estimate?.price.totalMinor ?? null);
      }}
    >
      <PageTitle title={steps.check.question} />
      {estimate !== null && <CheckAdvice advice={estimate.advice} />}
      <CheckAnswers />
      {design?.cake && estimate !== null && (
        <HowItIsCut design={design} menu={menu} portions={estimate.portions.fed} />
      )}
      {estimate !== null && (
        <Section title="Made with">
          <MadeWith
            offer={estimate}
            region={menu.studio.labelRegion}
            kitchenNotice={menu.studio.kitchenNotice}
          />
        </Section>
      )}
      <FinalPrice
        estimate={estimate}
        pending={server.isPending && design !== null}
        error={server.error}
        onRetry={() => void server.refetch()}
      />
      <SendRefusalNotice sending={sending} />
      <DateWatch />
      <p className="measure text-slate">
        {askWithoutDate
          ? `Sending asks the baker about your day; no place is kept until they answer, within ${menu.studio.answerHours} hours.`
          : `Sending keeps your day for ${menu.studio.guestHoldMinutes} minutes; opening the link we e-mail you keeps it until the baker answers, within ${menu.studio.answerHours} hours.`}{' '}
        Nothing is to be paid now, and the price is the baker’s to confirm.
      </p>
      <BottomBar
        step="check"
        action={
          <Button type="submit" pending={sending.pending}>
            {sending.refusal?.kind === 'price-changed' && total !== null
              ? `Send it at ${total}`
              : askWithoutDate
                ? 'Ask for this day'
                : 'Send my order'}
          </Button>
        }
        back={
          <Link to={paths.orderStep('you')} className="link inline-flex min-h-11 items-center">
            {steps.you.backwards}
          </Link>
        }
      />
    </form>
  );
}
