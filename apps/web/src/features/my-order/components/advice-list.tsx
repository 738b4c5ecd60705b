import type { Advice } from '#shared/contracts/estimates.ts';
import { ToneGlyph } from '#web/components/ui/notice.tsx';

type Props = {
  readonly advice: readonly Advice[];
  /** Once agreed, what else could have been chosen is past. */
  readonly agreed: boolean;
};

/** What to mind about this cake, the sharpest first. */
export function AdviceList({ advice, agreed }: Props) {
  const sorted = [
    ...advice.filter((it) => it.level === 'stop'),
    ...advice.filter((it) => it.level !== 'stop'),
  ];
  return (
    <ul className="grid gap-3">
      {sorted.map((it) => (
        <li key={`${it.code} ${it.about}`} className="flex gap-3">
          <ToneGlyph tone={it.level === 'stop' ? 'berry' : 'butter'} className="mt-0.5" />
          <p>
            <span className="font-semibold">{it.sentence}</span>
            {it.instead !== '' && !(agreed && it.level === 'stop') && ` ${it.instead}`}
          </p>
        </li>
      ))}
    </ul>
  );
}
