import * as z from 'zod/mini';
import type { Advice } from '#shared/contracts/estimates.ts';
import {
  type DeclaredAllergy,
  type StaffOrder,
  answerAllergy,
  liftStop,
} from '#shared/contracts/staff.ts';
import { Button } from '#web/components/ui/button.tsx';
import { errorOf } from '#web/components/ui/form-problems.tsx';
import { TextArea } from '#web/components/ui/text-area.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { Unfold } from '#web/components/ui/unfold.tsx';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { ActFailure } from '../actions/act-failure.tsx';
import { useAnswerAllergy } from '../api/answer-allergy.ts';
import { useLiftStop } from '../api/lift-stop.ts';

const answerForm = z.omit(answerAllergy, { rowVersion: true });
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
    <form
      noValidate
      className="grid gap-3"
      onSubmit={submit(async ({ text }) => {
        await answer.mutateAsync({ text, allergyId: allergy.id, rowVersion: order.rowVersion });
        toast({ message: 'The talk is noted with the order.' });
      })}
    >
      <ActFailure error={failure} />
      <TextArea
        {...form.register('text')}
        label="What was said and settled"
        hint="With whom, and what they decided. It stays with the order; what the cake contains stays as it is."
        rows={3}
        error={errorOf(form.formState.errors, 'text')}
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" pending={answer.isPending}>
          Note it
        </Button>
        <Button kind="quiet" onClick={onFold}>
          Not yet
        </Button>
      </div>
    </form>
  );
}

type LiftProps = { readonly order: StaffOrder; readonly blocker: Advice };

/** The owner's written reason to take an order against a stop. */
export function LiftStop(props: LiftProps) {
  return (
    <Unfold label="Take it all the same" kind="danger">
      {(fold) => <LiftForm {...props} onFold={fold} />}
    </Unfold>
  );
}

function LiftForm({ order, blocker, onFold }: LiftProps & { readonly onFold: () => void }) {
  const { form, failure, submit } = useContractForm(liftForm, { reason: '' });
  const lift = useLiftStop(order.number);
  const toast = useToast();
  return (
    <form
      noValidate
      className="grid gap-3"
      onSubmit={submit(async ({ reason }) => {
        await lift.mutateAsync({ reason, about: blocker.about, rowVersion: order.rowVersion });
        toast({ message: 'Your reason is noted; the customer reads it.' });
      })}
    >
      <ActFailure error={failure} />
      <TextArea
        {...form.register('reason')}
        label="Why you take it all the same"
        hint="It stays with the order for good, and the customer reads and accepts it."
        rows={3}
        error={errorOf(form.formState.errors, 'reason')}
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" kind="danger" pending={lift.isPending}>
          Take it, for this reason
        </Button>
        <Button kind="quiet" onClick={onFold}>
          Not yet
        </Button>
      </div>
    </form>
  );
}
