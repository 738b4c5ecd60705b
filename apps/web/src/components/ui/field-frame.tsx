import type { ReactNode } from 'react';
import { classNames } from '#web/lib/class-names.ts';

export type FieldText = {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  /** Says "(if you like)" after the label. */
  readonly optional?: boolean;
};

/** Ids of a field's hint and error, for `aria-describedby`. */
export function describedBy(id: string, { hint, error }: FieldText): string | undefined {
  const ids = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter((it) => it !== '');
  return ids.length > 0 ? ids.join(' ') : undefined;
}

/** The look of a control one types into. */
export function controlClasses(error: string | undefined, className?: string): string {
  return classNames(
    'block min-h-11 w-full rounded-action bg-enamel px-3 py-2 text-ink',
    error ? 'border-2 border-berry' : 'border-[1.5px] border-slate',
    className,
  );
}

/** Label above, hint between, control, then what is wrong with it. */
export function FieldFrame({
  id,
  label,
  hint,
  error,
  optional,
  children,
}: FieldText & { readonly id: string; readonly children: ReactNode }) {
  return (
    <div className="grid gap-1.5">
      <label htmlFor={id} className="font-semibold">
        {label}
        {optional && <span className="font-normal text-slate"> (if you like)</span>}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-sm text-slate">
          {hint}
        </p>
      )}
      {children}
      <FieldError id={`${id}-error`} message={error} />
    </div>
  );
}

/** What is wrong, beside the field. */
export function FieldError({
  id,
  message,
}: {
  readonly id: string;
  readonly message: string | undefined;
}) {
  if (!message) return null;
  return (
    <p id={id} className="flex items-start gap-2 text-sm font-semibold text-berry">
      <svg viewBox="0 0 16 16" className="mt-0.5 size-4 shrink-0" aria-hidden="true">
        <circle cx="8" cy="8" r="7" fill="currentColor" />
        <path
          d="M8 4.2v4.4M8 11.4v.4"
          stroke="var(--color-enamel)"
          strokeWidth="1.8"
          strokeLinecap="round"
        />
      </svg>
      {message}
    </p>
  );
}
