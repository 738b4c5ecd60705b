import type { Menu } from '#shared/contracts/menu.ts';
import { fareInHeat } from '#shared/kitchen/heat.ts';
import { formatTemperature } from '#shared/kitchen/measures.ts';

type Props = {
  readonly limitC: number;
  /** The warmest it will get, where it was said. */
  readonly warmestC: number | null;
  readonly menu: Menu;
};

const coolestC = 16;
const warmestShownC = 36;
const at = (celsius: number) =>
  (100 * (Math.min(warmestShownC, Math.max(coolestC, celsius)) - coolestC)) /
  (warmestShownC - coolestC);

/**
 * How warm a coat may get: full up to where it stands well, pale to where it still holds, empty
 * above; the table's own warmth a tick upon it. The words beside it say the same.
 */
export function WarmthScale({ limitC, warmestC, menu }: Props) {
  const well = at(limitC - menu.kitchen.heatMarginC);
  const still = at(limitC);
  return (
    <span className="grid gap-1">
      <span className="tabular-nums">
        to {formatTemperature(limitC, menu.studio.temperatureLead)}
      </span>
      <svg viewBox="0 0 104 12" className="block h-auto w-full max-w-44" aria-hidden="true">
        <g transform="translate(2 0)">
          <rect x="0" y="4" width={well} height="4" fill="var(--color-cobalt)" />
          <rect x={well} y="4" width={still - well} height="4" fill="var(--color-butter)" />
          <path d="M0 3.5h100v5H0z" fill="none" stroke="var(--color-slate)" strokeWidth="0.8" />
          {warmestC !== null && (
            <path
              d={`M${at(warmestC)} 0v12`}
              strokeWidth="2"
              stroke={
                fareInHeat(limitC, warmestC, menu.kitchen) === 'stop'
                  ? 'var(--color-berry)'
                  : 'var(--color-ink)'
              }
            />
          )}
        </g>
      </svg>
    </span>
  );
}
