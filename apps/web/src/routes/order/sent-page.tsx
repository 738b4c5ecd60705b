import { useMenuQuery } from '#web/features/menu/api/get-menu.ts';
import { SentNotice } from '#web/features/order-wizard/components/sent-notice.tsx';

/** The page after sending. */
export function SentPage() {
  const studio = useMenuQuery().data?.studio;
  return (
    <SentNotice
      answerHours={studio?.answerHours ?? null}
      guestHoldMinutes={studio?.guestHoldMinutes ?? null}
    />
  );
}
