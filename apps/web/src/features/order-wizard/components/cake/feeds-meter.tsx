import { useWizard } from '../../wizard/wizard-context.ts';
import { Aloud } from '../frame/estimate-lines.tsx';

/** How many the cake feeds, against how many will eat. */
export function FeedsMeter() {
  const { running, design } = useWizard();
  const { estimate } = running;
  if (estimate === null || !design?.cake) return null;
  const { wanted, fed } = estimate.portions;
  const over = fed - wanted;
  const verdict =
    over < 0
      ? `${-over} short: ${design.cake.kind === 'sheet' ? 'take a larger sheet' : 'add a tier, take a larger one'}, or cutting cakes from the kitchen.`
      : over === 0
        ? 'Just enough.'
        : `${over} over.`;
  const share = Math.min(1, fed / Math.max(1, wanted));
  const sentence = `Feeds ${fed} of ${wanted}.`;
  return (
    <div className="grid gap-1.5">
      <p>
        <span className="font-display text-xl font-bold tabular-nums">{sentence}</span>{' '}
        <span className={over < 0 ? 'font-semibold text-berry' : 'text-slate'}>{verdict}</span>
      </p>
      <div aria-hidden="true" className="h-2 overflow-hidden rounded-round bg-seam">
        <div
          className={`h-full transition-[width] duration-200 ease-world ${over < 0 ? 'bg-butter' : 'bg-leaf'}`}
          style={{ width: `${share * 100}%` }}
        />
      </div>
      <Aloud text={`${sentence} ${verdict}`} />
    </div>
  );
}
