import type { AdviceLevel } from '#shared/contracts/vocabulary.ts';
import { classNames } from '#web/lib/class-names.ts';

const words: Readonly<Record<AdviceLevel, string>> = {
  ok: 'Suits your day',
  care: 'With care',
  stop: 'Not for your day',
};

const colours: Readonly<Record<AdviceLevel, string>> = {
  // On their tints, since the row under them changes its own when it is chosen.
  ok: '-ml-1 rounded-mark bg-leaf-tint px-1 text-leaf',
  care: '-ml-1 rounded-mark bg-butter-tint px-1 text-ink',
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
      <span className={classNames('w-fit font-semibold', colours[level])}>{words[level]}</span>
      <span className="font-normal text-slate">{sentence}</span>
    </span>
  );
}
