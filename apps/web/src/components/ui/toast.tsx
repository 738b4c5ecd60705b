import {
  type ReactNode,
  createContext,
  useCallback,
  useContext,
  useEffect,
  useMemo,
  useState,
} from 'react';

export type Toast = {
  readonly message: string;
  /** Takes back what was just done. */
  readonly onUndo?: () => void;
};

type Shown = Toast & { readonly key: number };

/** Long enough to read and to reach Undo; a pointer or focus on it holds it. */
const shownMs = 12_000;

const ToastContext = createContext<((toast: Toast) => void) | null>(null);

/** Shows a line of news at the foot of the screen, with Undo where it can be undone. */
export function useToast(): (toast: Toast) => void {
  const show = useContext(ToastContext);
  if (!show) throw new Error('useToast needs a ToastProvider above it.');
  return show;
}

/** Keeps the live region that news appears in. */
export function ToastProvider({ children }: { readonly children: ReactNode }) {
  const [toast, setToast] = useState<Shown | null>(null);
  const [held, setHeld] = useState(false);
  const show = useCallback(
    (next: Toast) => setToast((last) => ({ ...next, key: (last?.key ?? 0) + 1 })),
    [],
  );

  useEffect(() => {
    if (!toast || held) return undefined;
    const timer = setTimeout(() => setToast(null), shownMs);
    return () => clearTimeout(timer);
  }, [toast, held]);

  const region = useMemo(
    () =>
      toast && (
        <div
          key={toast.key}
          className="flex items-center gap-4 rounded-action bg-ink py-2 pr-2 pl-4 text-enamel"
        >
          <p className="py-1.5">{toast.message}</p>
          {toast.onUndo && (
            <button
              type="button"
              className="min-h-11 rounded-action px-3 font-semibold text-butter focus-visible:outline-butter"
              onClick={() => {
                toast.onUndo?.();
                setToast(null);
              }}
            >
              Undo
            </button>
          )}
          <button
            type="button"
            className="min-h-11 rounded-action px-3 font-semibold focus-visible:outline-butter"
            onClick={() => setToast(null)}
          >
            Close
          </button>
        </div>
      ),
    [toast],
  );

  return (
    <ToastContext value={show}>
      {children}
      <div
        role="status"
        data-print="no"
        className="fixed inset-x-4 bottom-4 z-20 max-lg:[:root:has([data-foot])_&]:bottom-24 mx-auto grid w-fit max-w-xl"
        onPointerEnter={() => setHeld(true)}
        onPointerLeave={() => setHeld(false)}
        onFocus={() => setHeld(true)}
        onBlur={() => setHeld(false)}
      >
        {region}
      </div>
    </ToastContext>
  );
}
