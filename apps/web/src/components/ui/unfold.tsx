import { type ReactNode, useEffect, useRef, useState } from 'react';
import { Button, type ButtonKind } from './button.tsx';

type Props = {
  readonly label: ReactNode;
  readonly kind?: ButtonKind;
  /** What unfolds; it is given the way to fold itself up again. */
  readonly children: (fold: () => void) => ReactNode;
};

const controls = 'input, textarea, select, button';

/** A button in whose place a small form unfolds; the focus goes into it, and back to the button. */
export function Unfold({ label, kind = 'secondary', children }: Props) {
  const [open, setOpen] = useState(false);
  const [folded, setFolded] = useState(0);
  const body = useRef<HTMLDivElement>(null);

  useEffect(() => {
    if (open || folded > 0) body.current?.querySelector<HTMLElement>(controls)?.focus();
  }, [open, folded]);

  return (
    <div ref={body} data-print="no">
      {open ? (
        children(() => {
          setOpen(false);
          setFolded((times) => times + 1);
        })
      ) : (
        <Button kind={kind} aria-expanded={false} onClick={() => setOpen(true)}>
          {label}
        </Button>
      )}
    </div>
  );
}
