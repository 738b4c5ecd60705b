import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { classNames } from '#web/lib/class-names.ts';

const words: Readonly<Record<AdviceLevel, string>> = {
  ok: 'Suits your day',
  care: 'With care',
  stop: 'Not for your day',
};

const colours: Readonly<Record<AdviceLevel, string>> = {
  ok: 'text-leaf',
  care: 'text-ink',
  stop: 'text-berry',
};

/** How a coat fares: first in two words, then why. */
export function Verdict({
  level,
  sentence,
}: {
  readonly level: AdviceLevel;
  readonly sentence: string;
}) {
  return (
    <span className="grid gap-0.5 text-sm">
      <span className={classNames('font-semibold', colours[level])}>
        {level === 'care' ? (
          <span className="-ml-1 rounded-mark bg-butter-tint px-1">{words.care}</span>
        ) : (
          words[level]
        )}
      </span>
      <span className="font-normal text-slate">{sentence}</span>
    </span>
  );
}
