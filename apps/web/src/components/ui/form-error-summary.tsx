import { useEffect, useRef } from 'react';
import { type FieldProblem, fieldId } from '#web/lib/forms.ts';

type Props = {
  readonly problems: readonly FieldProblem[];
  /** Changes with every try to send (react-hook-form's `submitCount`); focus comes here each time. */
  readonly attempt: number;
  readonly title?: string;
};

/** What must be looked at before the form can be sent, each a link to its field. */
export function FormErrorSummary({
  problems,
  attempt,
  title = 'Some answers need another look',
}: Props) {
  const box = useRef<HTMLDivElement>(null);
  const any = problems.length > 0;
  useEffect(() => {
    if (any && attempt > 0) box.current?.focus();
    // Only a new attempt moves the focus; typing, which changes the problems, must not.
  }, [attempt, any]);

  if (!any) return null;
  return (
    <div
      ref={box}
      tabIndex={-1}
      role="alert"
      className="grid gap-2 rounded-action border-2 border-berry bg-berry-tint px-4 py-3"
    >
      <h2 className="text-lg">{title}</h2>
      <ul className="grid gap-1">
        {problems.map(({ name, message }) => (
          <li key={`${name} ${message}`}>
            <a
              href={`#${fieldId(name)}`}
              className="inline-block py-0.5 font-semibold text-berry underline underline-offset-3"
              onClick={(event) => {
                const field = document.getElementById(fieldId(name));
                if (!field) return;
                event.preventDefault();
                field.scrollIntoView({ block: 'center' });
                field.focus({ preventScroll: true });
              }}
            >
              {message}
            </a>
          </li>
        ))}
      </ul>
    </div>
  );
}
