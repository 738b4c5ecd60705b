import type { ReactNode } from 'react';
import { formatLength, parseLength } from '#shared/kitchen/measures.ts';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { readAmount, readShare, writeAmount, writeShare } from '../draft/figures.ts';
import { usePriceDraft } from '../draft/price-draft.ts';

type FieldProps = {
  /** Its place in the book, for its problem and the summary's link. */
  readonly place: string;
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly value: number;
  readonly onValue: (value: number) => void;
};

const figures = 'max-w-28 tabular-nums';
const orUnread = (value: number | null) => value ?? Number.NaN;

/** An amount of money in the book's currency. */
export function AmountField({ place, label, hint, value, onValue }: FieldProps) {
  const { content, problemAt } = usePriceDraft();
  const { currency } = content;
  return (
    <NumberField
      name={place}
      label={label}
      hint={hint}
      error={problemAt(place)}
      inputMode="decimal"
      className={figures}
      unit={currency}
      read={(text) => readAmount(text, currency)}
      write={(minor) => writeAmount(minor, currency)}
      value={value}
      onValue={(typed) => onValue(orUnread(typed))}
    />
  );
}

/** A percentage, kept in parts per million. */
export function ShareField({ place, label, hint, value, onValue }: FieldProps) {
  const { problemAt } = usePriceDraft();
  return (
    <NumberField
      name={place}
      label={label}
      hint={hint}
      error={problemAt(place)}
      inputMode="decimal"
      className={figures}
      unit="%"
      read={readShare}
      write={writeShare}
      value={value}
      onValue={(typed) => onValue(orUnread(typed))}
    />
  );
}

/** A width, in the studio's own unit first. */
export function WidthField({ place, label, hint, value, onValue }: FieldProps) {
  const { menu, problemAt } = usePriceDraft();
  const { lengthLead } = menu.studio;
  return (
    <NumberField
      name={place}
      label={label}
      hint={hint}
      error={problemAt(place)}
      inputMode="text"
      className="max-w-40 tabular-nums"
      read={(text) => parseLength(text, lengthLead)}
      write={(mm) => formatLength(mm, lengthLead)}
      value={value}
      onValue={(typed) => onValue(orUnread(typed))}
    />
  );
}

/** Whole days. */
export function DaysField({ place, label, hint, value, onValue }: FieldProps) {
  const { problemAt } = usePriceDraft();
  return (
    <NumberField
      name={place}
      label={label}
      hint={hint}
      error={problemAt(place)}
      className={figures}
      unit="days"
      value={value}
      onValue={(typed) => onValue(orUnread(typed))}
    />
  );
}
