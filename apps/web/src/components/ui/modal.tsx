import { type ReactNode, useEffect, useId, useRef } from 'react';
import { classNames } from '#web/lib/class-names.ts';
import { VisuallyHidden } from './visually-hidden.tsx';

type Props = {
  readonly open: boolean;
  /** Asked for by Escape or the cross; the owner then sets `open`. */
  readonly onClose: () => void;
  readonly title: ReactNode;
  readonly className: string;
  readonly children: ReactNode;
};

/**
 * The native modal `<dialog>`: the browser keeps focus inside, makes the rest inert, closes on
 * Escape and gives focus back to where it came from.
 */
export function Modal({ open, onClose, title, className, children }: Props) {
  const box = useRef<HTMLDialogElement>(null);
  const heading = useId();

  useEffect(() => {
    const dialog = box.current;
    if (!dialog) return;
    if (open && !dialog.open) dialog.showModal();
    if (!open && dialog.open) dialog.close();
  }, [open]);

  return (
    <dialog
      ref={box}
      aria-labelledby={heading}
      className={classNames('bg-enamel p-0', className)}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      onClose={() => {
        if (open) onClose();
      }}
    >
      {open && (
        <div className="grid gap-5 p-5 sm:p-7">
          <div className="flex items-start justify-between gap-4">
            <h2 id={heading} tabIndex={-1}>
              {title}
            </h2>
            <button
              type="button"
              onClick={onClose}
              className="-m-2 grid size-11 shrink-0 place-items-center rounded-action text-cobalt hover:bg-cobalt-tint"
            >
              <svg viewBox="0 0 16 16" className="size-4" aria-hidden="true">
                <path
                  d="M2.5 2.5l11 11M13.5 2.5l-11 11"
                  stroke="currentColor"
                  strokeWidth="2"
                  strokeLinecap="round"
                />
              </svg>
              <VisuallyHidden>Close</VisuallyHidden>
            </button>
          </div>
          {children}
        </div>
      )}
    </dialog>
  );
}
