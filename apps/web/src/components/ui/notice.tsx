import type { ReactNode } from 'react';
import { classNames } from '#web/lib/class-names.ts';

export type Tone = 'plain' | 'butter' | 'leaf' | 'berry';

const tints: Record<Tone, string> = {
  plain: 'bg-cloud',
  butter: 'bg-butter-tint',
  leaf: 'bg-leaf-tint',
  berry: 'bg-berry-tint',
};

type Props = {
  readonly tone?: Tone;
  readonly title?: ReactNode;
  readonly children?: ReactNode;
  /** Said aloud when it appears: `polite` for news, `assertive` for what stops you. */
  readonly live?: 'polite' | 'assertive';
  readonly className?: string;
};

/** A sentence that stands out: attention (butter), good news (leaf) or a stop (berry). */
export function Notice({ tone = 'plain', title, children, live, className }: Props) {
  return (
    <div
      role={live === 'assertive' ? 'alert' : live === 'polite' ? 'status' : undefined}
      className={classNames('flex gap-3 rounded-action px-4 py-3', tints[tone], className)}
    >
      <ToneGlyph tone={tone} className="mt-0.5" />
      <div className="grid min-w-0 gap-1">
        {title && (
          <p className={classNames('font-semibold', tone === 'berry' && 'text-berry')}>{title}</p>
        )}
        {children && <div className="grid gap-2">{children}</div>}
      </div>
    </div>
  );
}

/** The mark of a tone, so that it never speaks by colour alone. */
export function ToneGlyph({
  tone,
  className,
}: {
  readonly tone: Tone;
  readonly className?: string;
}) {
  const classes = classNames('size-5 shrink-0', className);
  if (tone === 'leaf') {
    return (
      <svg viewBox="0 0 20 20" className={classNames(classes, 'text-leaf')} aria-hidden="true">
        <circle cx="10" cy="10" r="9" fill="currentColor" />
        <path
          d="M5.8 10.4l2.9 2.9 5.5-6"
          fill="none"
          stroke="var(--color-enamel)"
          strokeWidth="2"
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      </svg>
    );
  }
  if (tone === 'berry') {
    return (
      <svg viewBox="0 0 20 20" className={classNames(classes, 'text-berry')} aria-hidden="true">
        <path d="M6.3 1h7.4L19 6.3v7.4L13.7 19H6.3L1 13.7V6.3z" fill="currentColor" />
        <path
          d="M10 5.4v5.4M10 14.2v.4"
          stroke="var(--color-enamel)"
          strokeWidth="2.2"
          strokeLinecap="round"
        />
      </svg>
    );
  }
  if (tone === 'butter') {
    return (
      <svg viewBox="0 0 20 20" className={classes} aria-hidden="true">
        <path
          d="M10 1.8L19 17.6H1z"
          fill="var(--color-butter)"
          stroke="var(--color-ink)"
          strokeWidth="1.4"
          strokeLinejoin="round"
        />
        <path
          d="M10 7.2v4.6M10 14.4v.3"
          stroke="var(--color-ink)"
          strokeWidth="2"
          strokeLinecap="round"
        />
      </svg>
    );
  }
  return (
    <svg viewBox="0 0 20 20" className={classNames(classes, 'text-cobalt')} aria-hidden="true">
      <circle cx="10" cy="10" r="8.2" fill="none" stroke="currentColor" strokeWidth="1.6" />
      <path d="M10 9v5.2M10 5.8v.3" stroke="currentColor" strokeWidth="2.1" strokeLinecap="round" />
    </svg>
  );
}
