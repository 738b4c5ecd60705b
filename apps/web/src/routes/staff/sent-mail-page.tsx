import { useNavigate, useParams } from 'react-router-dom';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { useSentMail } from '#web/features/sent-mail/api/get-sent-mail.ts';
import { SentMail } from '#web/features/sent-mail/components/sent-mail.tsx';

/** `/staff/mail/:id` */
export function SentMailPage() {
  const { zone, locale } = useMenu().studio;
  const { data, error, isPending, refetch, isFetching } = useSentMail(useParams().id ?? '');
  const navigate = useNavigate();
  return (
    <div className="page py-6">
      <div className="grid max-w-4xl gap-5">
        <div>
          <Button kind="quiet" className="-ml-2" onClick={() => void navigate(-1)}>
            Back
          </Button>
        </div>
        <PageTitle title={data?.subject ?? 'E-mail'} />
        {isPending ? (
          <Pending what="Fetching the e-mail…" />
        ) : data === undefined ? (
          <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
        ) : (
          <SentMail mail={data} zone={zone} locale={locale} />
        )}
      </div>
    </div>
  );
}
