import { classNames } from '#web/lib/class-names.ts';

/** Tierwell's mark: three stacked tiers inside a rimmed square. */
export function TierwellMark({ className }: { readonly className?: string }) {
  return (
    <svg
      viewBox="0 0 32 32"
      className={classNames('shrink-0', className ?? 'size-7')}
      aria-hidden="true"
    >
      <rect
        x="2"
        y="2"
        width="28"
        height="28"
        rx="8"
        fill="var(--color-enamel)"
        stroke="var(--color-cobalt)"
        strokeWidth="2.6"
      />
      <g fill="var(--color-cobalt)">
        <rect x="13" y="8.5" width="6" height="4" rx="1.2" />
        <rect x="10.5" y="14" width="11" height="4" rx="1.2" />
        <rect x="8" y="19.5" width="16" height="4" rx="1.2" />
      </g>
    </svg>
  );
}
