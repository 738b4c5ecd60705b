import * as z from 'zod/mini';
import {
  type Blocker,
  type DeclaredAllergy,
  type StaffOrder,
  answerAllergy,
  liftStop,
  recordTalk,
} from '#shared/contracts/staff.ts';
import { errorOf } from '#web/components/ui/form-problems.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { Unfold } from '#web/components/ui/unfold.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useAnswerAllergy } from '../api/answer-allergy.ts';
import { useLiftStop } from '../api/lift-stop.ts';
import { useRecordTalk } from '../api/record-talk.ts';
import { NoteForm } from './note-form.tsx';

const answerForm = z.omit(answerAllergy, { rowVersion: true });
const talkForm = z.omit(recordTalk, { rowVersion: true, about: true });
const liftForm = z.omit(liftStop, { rowVersion: true, about: true });

type AnswerProps = { readonly order: StaffOrder; readonly allergy: DeclaredAllergy };

/** Records the talk about one declared allergy. */
export function AnswerAllergy(props: AnswerProps) {
  return (
    <Unfold label="Record the talk">{(fold) => <AnswerForm {...props} onFold={fold} />}</Unfold>
  );
}

function AnswerForm({ order, allergy, onFold }: AnswerProps & { readonly onFold: () => void }) {
  const { form, failure, submit } = useContractForm(answerForm, { text: '' });
  const answer = useAnswerAllergy(order.number);
  const toast = useToast();
  return (
    <NoteForm
      failure={failure}
      pending={answer.isPending}
      onFold={onFold}
      onSubmit={submit(async ({ text }) => {
        await answer.mutateAsync({ text, allergyId: allergy.id, rowVersion: order.rowVersion });
        toast({ message: 'The talk is noted with the order.' });
      })}
    >
      <TextArea
        {...form.register('text')}
        label="What was said and settled"
        hint="With whom, and what they decided. It stays with the order; what the cake contains stays as it is."
        rows={3}
        error={errorOf(form.formState.errors, 'text')}
      />
    </NoteForm>
  );
}

type StopProps = { readonly order: StaffOrder; readonly blocker: Blocker };

/** Records the talk about a stop that no declared allergy stands behind. */
export function RecordTalk(props: StopProps) {
  return <Unfold label="Record the talk">{(fold) => <TalkForm {...props} onFold={fold} />}</Unfold>;
}

function TalkForm({ order, blocker, onFold }: StopProps & { readonly onFold: () => void }) {
  const { form, failure, submit } = useContractForm(talkForm, { text: '' });
  const record = useRecordTalk(order.number);
  const toast = useToast();
  return (
    <NoteForm
      failure={failure}
      pending={record.isPending}
      onFold={onFold}
      onSubmit={submit(async ({ text }) => {
        await record.mutateAsync({ text, about: blocker.about, rowVersion: order.rowVersion });
        toast({ message: 'The talk is noted with the order.' });
      })}
    >
      <TextArea
        {...form.register('text')}
        label="What was said and settled"
        hint="With whom, and what they decided. The stop stays until the owner takes it."
        rows={3}
        error={errorOf(form.formState.errors, 'text')}
      />
    </NoteForm>
  );
}

/** The owner's written reason to take an order against a stop. */
export function LiftStop(props: StopProps) {
  return (
    <Unfold label="Take it all the same" kind="danger">
      {(fold) => <LiftForm {...props} onFold={fold} />}
    </Unfold>
  );
}

function LiftForm({ order, blocker, onFold }: StopProps & { readonly onFold: () => void }) {
  const { form, failure, submit } = useContractForm(liftForm, { reason: '' });
  const lift = useLiftStop(order.number);
  const toast = useToast();
  return (
    <NoteForm
      failure={failure}
      pending={lift.isPending}
      submitLabel="Take it, for this reason"
      kind="danger"
      onFold={onFold}
      onSubmit={submit(async ({ reason }) => {
        await lift.mutateAsync({ reason, about: blocker.about, rowVersion: order.rowVersion });
        toast({ message: 'Your reason is noted. The customer is asked by e-mail to read it.' });
      })}
    >
      <TextArea
        {...form.register('reason')}
        label="Why you take it all the same"
        hint="It stays with the order for good. The customer reads it and has to accept it before anything is confirmed."
        rows={3}
        error={errorOf(form.formState.errors, 'reason')}
      />
    </NoteForm>
  );
}
