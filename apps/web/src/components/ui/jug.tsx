import { useId } from 'react';
import { classNames } from '#web/lib/class-names.ts';

type Props = {
  /** How full, 0 to 1; more than 1 is overfull. */
  readonly fill: number;
  /** Said to those who cannot see it; without it the words beside the jug must say as much. */
  readonly label?: string;
  readonly className?: string;
};

const body = 'M4 4h24l-2.6 26.4a2 2 0 0 1-2 1.6H8.6a2 2 0 0 1-2-1.6z';
const innerTop = 6;
const innerHeight = 25;

/** A measuring jug that fills with the day's load. Full is good news; only overfull is berry. */
export function Jug({ fill, label, className }: Props) {
  const clip = useId();
  const level = Math.min(1, Math.max(0, fill)) * innerHeight;
  const over = fill > 1;
  return (
    <svg
      viewBox="0 0 38 35"
      className={classNames('shrink-0', className ?? 'h-8')}
      role={label === undefined ? undefined : 'img'}
      aria-label={label}
      aria-hidden={label === undefined ? true : undefined}
    >
      <clipPath id={clip}>
        <path d={body} />
      </clipPath>
      <rect
        clipPath={`url(#${clip})`}
        x="2"
        width="28"
        y={innerTop + innerHeight - level + 1}
        height={level + 1}
        fill={over ? 'var(--color-berry)' : 'var(--color-cobalt)'}
        fillOpacity={over ? 1 : 0.85}
        style={{ transition: 'y 180ms var(--ease-world), height 180ms var(--ease-world)' }}
      />
      <g
        fill="none"
        stroke={over ? 'var(--color-berry)' : 'var(--color-ink)'}
        strokeWidth="1.8"
        strokeLinecap="round"
        strokeLinejoin="round"
      >
        <path d="M1.5 4L4 4.2M4 4h24l-2.6 26.4a2 2 0 0 1-2 1.6H8.6a2 2 0 0 1-2-1.6z" />
        <path d="M27.6 8.5c5-.8 8.2 1.6 8.2 6.4 0 5-4.2 8.6-9.6 8.6" />
      </g>
      <g
        stroke={level > innerHeight * 0.8 ? 'var(--color-enamel)' : 'var(--color-ink)'}
        strokeWidth="1.3"
        strokeLinecap="round"
      >
        <path d="M21.5 11h5" />
      </g>
      <g
        stroke={level > innerHeight * 0.55 ? 'var(--color-enamel)' : 'var(--color-ink)'}
        strokeWidth="1.3"
        strokeLinecap="round"
      >
        <path d="M23 17.5h3" />
      </g>
      <g
        stroke={level > innerHeight * 0.3 ? 'var(--color-enamel)' : 'var(--color-ink)'}
        strokeWidth="1.3"
        strokeLinecap="round"
      >
        <path d="M20.8 24h4.6" />
      </g>
    </svg>
  );
}
