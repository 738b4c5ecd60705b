import { useEffect } from 'react';
import { writeMessage } from '#shared/contracts/orders.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { MessagesList } from '#web/components/order/messages-list.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { FormProblems, errorOf } from '#web/components/ui/form-problems.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useReadMessages } from '../api/read-messages.ts';
import { useWriteToCustomer } from '../api/write-to-customer.ts';

type Props = { readonly order: StaffOrder; readonly menu: Menu };

/** What was written both ways, and a place to write. */
export function OrderMessages({ order, menu }: Props) {
  const { mutate: read } = useReadMessages(order.number);
  const unread = order.unread > 0;
  useEffect(() => {
    if (unread) read();
  }, [unread, read]);
  return (
    <div className="grid gap-4">
      <MessagesList
        messages={order.messages}
        nameOf={(it) =>
          it.from === 'studio' ? `${it.authorName}, ${menu.studio.name}` : it.authorName
        }
        zone={menu.studio.zone}
        locale={menu.studio.locale}
      />
      {order.can.write && <WriteForm order={order} />}
    </div>
  );
}

function WriteForm({ order }: { readonly order: StaffOrder }) {
  const { form, failure, submit } = useContractForm(writeMessage, { body: '' });
  const write = useWriteToCustomer(order.number);
  const toast = useToast();
  const customer = order.contacts.find((it) => it.as === 'ordered')?.name ?? 'the customer';
  return (
    <form
      noValidate
      data-print="no"
      className="grid gap-4"
      onSubmit={submit(async (values) => {
        await write.mutateAsync(values);
        form.reset();
        toast({ message: `Your message is on its way to ${customer}.` });
      })}
    >
      <FormProblems form={form} failure={failure} />
      <TextArea
        {...form.register('body')}
        label={`Write to ${customer}`}
        hint="Also goes to them by e-mail, with the studio’s name."
        error={errorOf(form.formState.errors, 'body')}
      />
      <div>
        <Button type="submit" kind="secondary" pending={write.isPending}>
          Send the message
        </Button>
      </div>
    </form>
  );
}
