import * as z from 'zod/mini';
import { acknowledgeContents, tellContents } from '#shared/contracts/contents.ts';
import type { StaffContentChange } from '#shared/contracts/contents.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { Button } from '#web/components/ui/button.tsx';
import { errorOf } from '#web/components/ui/form-problems.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { Unfold } from '#web/components/ui/unfold.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { ActFailure } from '../actions/act-failure.tsx';
import { useAcknowledgeContents } from '../api/acknowledge-contents.ts';
import { useTellContents } from '../api/tell-contents.ts';
import { NoteForm } from './note-form.tsx';

const seenForm = z.omit(acknowledgeContents, { rowVersion: true });
const toldForm = z.omit(tellContents, { rowVersion: true });

type Props = { readonly order: StaffOrder; readonly change: StaffContentChange };
type FormProps = Props & { readonly onFold: () => void };

/** A baker has seen it; words are needed only where it is against what guests told. */
export function AcknowledgeContents({ order, change }: Props) {
  const acknowledge = useAcknowledgeContents(order.number);
  const toast = useToast();
  if (change.clashes.length > 0) {
    return (
      <Unfold label="Say what you do about it">
        {(fold) => <SeenForm order={order} change={change} onFold={fold} />}
      </Unfold>
    );
  }
  return (
    <div className="grid gap-2">
      <ActFailure error={acknowledge.error} />
      <div>
        <Button
          kind="secondary"
          pending={acknowledge.isPending}
          onClick={() =>
            acknowledge.mutate(
              { changeId: change.id, note: '', rowVersion: order.rowVersion },
              { onSuccess: () => toast({ message: 'Noted that you have seen it.' }) },
            )
          }
        >
          I have seen it
        </Button>
      </div>
    </div>
  );
}

function SeenForm({ order, change, onFold }: FormProps) {
  const { form, failure, submit } = useContractForm(seenForm, { note: '' });
  const acknowledge = useAcknowledgeContents(order.number);
  const toast = useToast();
  return (
    <NoteForm
      failure={failure}
      pending={acknowledge.isPending}
      onFold={onFold}
      onSubmit={submit(async ({ note }) => {
        await acknowledge.mutateAsync({
          note,
          changeId: change.id,
          rowVersion: order.rowVersion,
        });
        toast({ message: 'What you do about it is noted with the order.' });
      })}
    >
      <TextArea
        {...form.register('note')}
        label="What is done about it"
        hint="It stays with the order, for whoever makes it and hands it over."
        rows={3}
        error={errorOf(form.formState.errors, 'note')}
      />
    </NoteForm>
  );
}

/** Records that the customer was told by phone or in person. */
export function TellContents(props: Props) {
  return (
    <Unfold label="I have told them">{(fold) => <ToldForm {...props} onFold={fold} />}</Unfold>
  );
}

function ToldForm({ order, change, onFold }: FormProps) {
  const { form, failure, submit } = useContractForm(toldForm, { how: '' });
  const tell = useTellContents(order.number);
  const toast = useToast();
  return (
    <NoteForm
      failure={failure}
      pending={tell.isPending}
      onFold={onFold}
      onSubmit={submit(async ({ how }) => {
        await tell.mutateAsync({ how, changeId: change.id, rowVersion: order.rowVersion });
        toast({ message: 'Noted that the customer knows.' });
      })}
    >
      <TextArea
        {...form.register('how')}
        label="How they were told"
        hint="“Rang her at noon”, and what they said to it."
        rows={2}
        error={errorOf(form.formState.errors, 'how')}
      />
    </NoteForm>
  );
}
