import { type OrderView, writeMessage } from '#shared/contracts/orders.ts';
import { MessagesList } from '#web/components/order/messages-list.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useWriteMessage } from '../api/write-message.ts';

type Props = { readonly order: OrderView; readonly studio: string; readonly locale: string };

/** What has been written both ways, oldest first, and a place to write. */
export function MessageThread({ order, studio, locale }: Props) {
  return (
    <div className="grid gap-5">
      <MessagesList
        messages={order.messages}
        nameOf={(it) => (it.from === 'studio' ? `${it.authorName}, ${studio}` : it.authorName)}
        zone={order.pickup.zone}
        locale={locale}
      />
      {order.can.write && <MessageForm code={order.code} />}
    </div>
  );
}

function MessageForm({ code }: { readonly code: string }) {
  const { form, failure, submit } = useContractForm(writeMessage, { body: '' });
  const { mutateAsync, isPending } = useWriteMessage(code);
  const toast = useToast();
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={submit(async (values) => {
        await mutateAsync(values);
        form.reset();
        toast({ message: 'Your message is with the studio.' });
      })}
    >
      <FormProblems form={form} failure={failure} />
      <TextArea
        {...form.register('body')}
        label="Write to the studio"
        error={errorOf(form.formState.errors, 'body')}
      />
      <div>
        <Button type="submit" kind="secondary" pending={isPending}>
          Send the message
        </Button>
      </div>
    </form>
  );
}
