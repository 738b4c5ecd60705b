import { type OrderView, writeMessage } from '#shared/contracts/orders.ts';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useWriteMessage } from '../api/write-message.ts';
import { instantWords } from '../order-words.ts';

type Props = { readonly order: OrderView; readonly studio: string; readonly locale: string };

/** What has been written both ways, oldest first, and a place to write. */
export function MessageThread({ order, studio, locale }: Props) {
  return (
    <div className="grid gap-5">
      {order.messages.length === 0 && <p className="text-slate">Nothing has been written yet.</p>}
      <ol className="grid divide-y divide-seam">
        {order.messages.map((it) => (
          <li key={it.id} className="grid gap-1 py-3">
            <p className="flex flex-wrap items-baseline justify-between gap-x-4">
              <strong>
                {it.from === 'studio' ? `${it.authorName}, ${studio}` : it.authorName}
              </strong>
              <time dateTime={it.at} className="text-sm text-slate tabular-nums">
                {instantWords(it.at, order.pickup.zone, locale)}
              </time>
            </p>
            <p className="measure whitespace-pre-line">{it.body}</p>
          </li>
        ))}
      </ol>
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
