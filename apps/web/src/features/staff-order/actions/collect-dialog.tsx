import { useState } from 'react';
import * as z from 'zod/mini';
import type { Photo } from '#shared/contracts/photos.ts';
import { collectOrder } from '#shared/contracts/staff.ts';
import { Button } from '#web/components/ui/button.tsx';
import { DialogActions } from '#web/components/ui/dialog-actions.tsx';
import { FormErrorSummary } from '#web/components/ui/form-error-summary.tsx';
import { errorOf } from '#web/components/ui/form-problems.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { listFieldProblems } from '#web/lib/forms.ts';
import { useContractForm } from '#web/lib/use-contract-form.ts';
import { useCollectOrder } from '../api/collect-order.ts';
import { SayAtHandover } from '../components/say-at-handover.tsx';
import { PhotoChoice } from '../components/photo-choice.tsx';
import { ActFailure } from './act-failure.tsx';
import type { ActProps } from './act-props.ts';

const collectForm = z.omit(collectOrder, { rowVersion: true, photoId: true });

/** The handover: who took it, in what condition, with a photo if there is one. */
export function CollectDialog({ order, menu, onDone, onClose }: ActProps) {
  const expected =
    order.contacts.find((it) => it.as === 'collects')?.name ??
    order.contacts.find((it) => it.as === 'ordered')?.name ??
    '';
  const { form, failure, submit } = useContractForm(collectForm, {
    collectedBy: expected,
    condition: '',
  });
  const [photo, setPhoto] = useState<Photo | null>(null);
  const collect = useCollectOrder(order.number);
  const toast = useToast();
  const { errors, submitCount } = form.formState;
  return (
    <form
      noValidate
      className="grid gap-5"
      onSubmit={submit(async (values) => {
        await collect.mutateAsync({
          ...values,
          photoId: photo?.id ?? null,
          rowVersion: order.rowVersion,
        });
        toast({
          message: `No. ${order.number} is collected; a thank-you is on its way to the customer.`,
        });
        onDone();
      })}
    >
      <FormErrorSummary problems={listFieldProblems(errors)} attempt={submitCount} />
      <ActFailure error={failure} />
      <SayAtHandover order={order} menu={menu} />
      <TextField
        {...form.register('collectedBy')}
        label="Who takes it"
        hint={expected === '' ? undefined : `Expected: ${expected}`}
        autoComplete="off"
        error={errorOf(errors, 'collectedBy')}
      />
      <TextField
        {...form.register('condition')}
        label="How it looked"
        hint="For example: upright, cold, no marks; box closed in front of them."
        optional
        autoComplete="off"
        error={errorOf(errors, 'condition')}
      />
      <PhotoChoice
        number={order.number}
        kind="handover"
        label="A photo of it"
        hint="Kept with the order, for the studio and the customer."
        photo={photo}
        onPhoto={setPhoto}
      />
      <DialogActions>
        <Button type="submit" pending={collect.isPending}>
          It is collected
        </Button>
        <Button kind="quiet" onClick={onClose}>
          Not yet
        </Button>
      </DialogActions>
    </form>
  );
}
