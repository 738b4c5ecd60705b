import type { ReactNode, SyntheticEvent } from 'react';
import { Button } from '#web/components/ui/button.tsx';
import { ActFailure } from '../actions/act-failure.tsx';

type Props = {
  /** What sending went wrong with, beside the field's own error. */
  readonly failure: unknown;
  readonly pending: boolean;
  readonly submitLabel?: string;
  readonly kind?: 'primary' | 'danger';
  readonly onSubmit: (event: SyntheticEvent) => void;
  readonly onFold: () => void;
  /** The field for the words. */
  readonly children: ReactNode;
};

/** A few words to note with an order: the field, and a press to note them or leave it. */
export function NoteForm(props: Props) {
  const { failure, pending, submitLabel = 'Note it', kind = 'primary' } = props;
  const { onSubmit, onFold, children } = props;
  return (
    <form noValidate className="grid gap-3" onSubmit={onSubmit}>
      <ActFailure error={failure} />
      {children}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" kind={kind} pending={pending}>
          {submitLabel}
        </Button>
        <Button kind="quiet" onClick={onFold}>
          Not yet
        </Button>
      </div>
    </form>
  );
}
