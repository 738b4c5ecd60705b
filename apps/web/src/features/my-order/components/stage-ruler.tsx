import { classNames } from '#web/lib/class-names.ts';
import { stages } from '../order-words.ts';

/** How far the cake has come: coarse on purpose, a finer clock invites worry. */
export function StageRuler({ reached }: { readonly reached: number }) {
  return (
    <ol
      aria-label="How far your cake has come"
      className="relative grid grid-cols-4 border-t-[1.5px] border-cobalt"
    >
      {stages.map(({ stage, name }, at) => (
        <li
          key={stage}
          aria-current={at === reached ? 'step' : undefined}
          className={classNames(
            'border-l-[1.5px] border-cobalt px-1.5 pt-4 pb-1.5 text-[0.8rem] leading-tight sm:px-2 sm:text-sm',
            at <= reached && 'bg-butter-tint',
            at === reached ? 'font-bold' : at < reached ? 'font-medium' : 'text-slate',
          )}
        >
          {name}
          {at < reached && <span className="sr-only"> (done)</span>}
        </li>
      ))}
    </ol>
  );
}
