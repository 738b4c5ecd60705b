import type { OrderStatus } from '#shared/contracts/vocabulary.ts';
import { classNames } from '#web/lib/class-names.ts';

/** What a status means to the studio, in a few words. */
export const statusWords: Readonly<Record<OrderStatus, string>> = {
  asked: 'asked, waits for an answer',
  quoted: 'quoted',
  agreed: 'agreed, waits for the deposit',
  confirmed: 'confirmed',
  making: 'in the making',
  ready: 'ready',
  collected: 'collected',
  declined: 'declined',
  withdrawn: 'withdrawn',
  lapsed: 'lapsed',
  cancelled: 'cancelled',
  uncollected: 'not collected',
};

/** The same in one word, for lists and lanes. */
export const statusWord: Readonly<Record<OrderStatus, string>> = {
  ...statusWords,
  asked: 'asked',
  agreed: 'agreed',
  making: 'making',
};

type Look = 'waits' | 'stands' | 'done' | 'ended';

const looks: Readonly<Record<OrderStatus, Look>> = {
  asked: 'waits',
  quoted: 'waits',
  agreed: 'waits',
  confirmed: 'stands',
  making: 'stands',
  ready: 'done',
  collected: 'done',
  declined: 'ended',
  withdrawn: 'ended',
  lapsed: 'ended',
  cancelled: 'ended',
  uncollected: 'ended',
};

/** How many of a stack of tiers are filled in: the further along, the more of the cake there is. */
const tiersFilled: Readonly<Record<OrderStatus, number>> = {
  asked: 0,
  quoted: 0,
  agreed: 0,
  confirmed: 1,
  making: 2,
  ready: 3,
  collected: 3,
  declined: 0,
  withdrawn: 0,
  lapsed: 0,
  cancelled: 0,
  uncollected: 3,
};

const inks: Readonly<Record<Look, string>> = {
  waits: 'text-ink',
  stands: 'text-cobalt',
  done: 'text-leaf',
  ended: 'text-slate',
};

type Props = {
  readonly status: OrderStatus;
  readonly long?: boolean;
  readonly className?: string;
};

/** Where an order is in its life: a small stack that fills tier by tier, and the word. */
export function StatusMark({ status, long = false, className }: Props) {
  const look = looks[status];
  const filled = tiersFilled[status];
  return (
    <span
      className={classNames(
        'inline-flex items-center gap-1.5 font-semibold',
        inks[look],
        className,
      )}
    >
      <svg viewBox="0 0 18 16" className="h-4 w-[1.125rem] shrink-0" aria-hidden="true">
        {[
          { x: 1, y: 10.5, width: 16 },
          { x: 3.5, y: 6, width: 11 },
          { x: 6, y: 1.5, width: 6 },
        ].map((tier, at) => (
          <rect
            key={tier.y}
            {...tier}
            height="4"
            rx="1"
            fill={
              at < filled
                ? 'currentColor'
                : look === 'waits'
                  ? 'var(--color-butter)'
                  : 'var(--color-enamel)'
            }
            stroke="currentColor"
            strokeWidth="1.1"
          />
        ))}
        {look === 'ended' && (
          <path d="M1.5 14.5l15-13" stroke="currentColor" strokeWidth="1.6" strokeLinecap="round" />
        )}
      </svg>
      {(long ? statusWords : statusWord)[status]}
    </span>
  );
}
