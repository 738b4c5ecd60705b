import { type ReactNode, useState } from 'react';

type Props = {
  /** What lies behind it. */
  readonly label: ReactNode;
  /** Open from the start; it can be folded away afterwards. */
  readonly open?: boolean;
  readonly children: ReactNode;
};

/** Something most people do not need, one press away. */
export function Fold({ label, open = false, children }: Props) {
  // Only the start is ours: afterwards it is as the visitor left it, whatever is chosen inside.
  const [atStart] = useState(open);
  return (
    <details open={atStart || undefined} className="group min-w-0">
      <summary className="inline-flex min-h-11 list-none items-center gap-2 rounded-mark font-semibold text-cobalt hover:underline [&::-webkit-details-marker]:hidden">
        <svg
          viewBox="0 0 12 12"
          className="w-3 shrink-0 transition-transform duration-150 ease-world group-open:rotate-90"
          aria-hidden="true"
        >
          <path
            d="M4 1.5l4.5 4.5L4 10.5"
            fill="none"
            stroke="currentColor"
            strokeWidth="2"
            strokeLinecap="round"
            strokeLinejoin="round"
          />
        </svg>
        {label}
      </summary>
      <div className="pt-2">{children}</div>
    </details>
  );
}
