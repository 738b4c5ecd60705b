import type { SentMailView } from '#shared/contracts/staff.ts';
import { MailPreview } from '#web/components/mail-preview/mail-preview.tsx';
import { MailState } from '#web/components/order/mail-state.tsx';
import { instantWords } from '#web/components/order/order-times.ts';
import { Button } from '#web/components/ui/button.tsx';
import { DataList } from '#web/components/ui/data-list.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { useSendMailAgain } from '../api/send-mail-again.ts';

type Props = {
  readonly mail: SentMailView;
  readonly zone: string;
  readonly locale: string;
};

/** An e-mail exactly as it went out, and a way to send it once more. */
export function SentMail({ mail, zone, locale }: Props) {
  const again = useSendMailAgain();
  const toast = useToast();
  return (
    <div className="grid gap-5">
      {again.isError && <Failure error={again.error} />}
      <DataList
        rows={[
          { key: 'to', label: 'To', value: <span className="break-all">{mail.to}</span> },
          { key: 'when', label: 'When', value: instantWords(mail.at, zone, locale) },
          {
            key: 'state',
            label: 'What became of it',
            value: <MailState state={mail.state} lastError={mail.lastError} />,
          },
          ...(mail.attempts > 1
            ? [{ key: 'attempts', label: 'Attempts', value: String(mail.attempts) }]
            : []),
        ]}
      />
      <Rim label="The e-mail" className="p-4 sm:p-6">
        <MailPreview html={mail.html} text={mail.text} title={mail.subject} />
      </Rim>
      {(mail.state === 'sent' || mail.state === 'given-up') && (
        <div>
          <Button
            kind="secondary"
            pending={again.isPending}
            onClick={() =>
              again.mutate(mail.id, {
                onSuccess: () => toast({ message: `It is on its way to ${mail.to} once more.` }),
              })
            }
          >
            Send it again
          </Button>
        </div>
      )}
    </div>
  );
}
