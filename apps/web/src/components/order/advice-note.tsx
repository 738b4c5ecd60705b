import type { Advice } from '#shared/contracts/estimates.ts';
import { type Tone, ToneGlyph } from '#web/components/ui/notice.tsx';
import { classNames } from '#web/lib/class-names.ts';

export const adviceTones: Readonly<Record<Advice['level'], Tone>> = {
  ok: 'leaf',
  care: 'butter',
  stop: 'berry',
};

const rank: Readonly<Record<Advice['level'], number>> = { stop: 0, care: 1, ok: 2 };

/** The gravest first. */
export function byGravity<Told extends Pick<Advice, 'level'>>(
  advice: readonly Told[],
): readonly Told[] {
  return advice.toSorted((a, b) => rank[a.level] - rank[b.level]);
}

type Props = {
  readonly advice: Pick<Advice, 'level' | 'sentence' | 'instead'>;
  readonly small?: boolean;
};

/** One piece of advice in words, with its mark, and what to do instead. */
export function AdviceNote({ advice, small = false }: Props) {
  return (
    <div className={classNames('flex gap-2.5', small && 'text-sm')}>
      <ToneGlyph tone={adviceTones[advice.level]} className="mt-0.5" />
      <div className="grid min-w-0 gap-0.5">
        <p className={classNames('font-semibold', advice.level === 'stop' && 'text-berry')}>
          {advice.sentence}
        </p>
        {advice.instead !== '' && <p className="text-slate">{advice.instead}</p>}
      </div>
    </div>
  );
}
