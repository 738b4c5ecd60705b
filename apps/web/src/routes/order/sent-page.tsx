import { useMenuQuery } from '#web/features/menu/api/get-menu.ts';
import { SentNotice } from '#web/features/order-wizard/components/sent-notice.tsx';

/** The page after sending. */
export function SentPage() {
  return <SentNotice studio={useMenuQuery().data?.studio ?? null} />;
}
