import type { Advice } from '#shared/contracts/estimates.ts';
import { ToneGlyph } from '#web/components/ui/notice.tsx';

/** What to mind about this cake, the sharpest first. */
export function AdviceList({ advice }: { readonly advice: readonly Advice[] }) {
  const sorted = [
    ...advice.filter((it) => it.level === 'stop'),
    ...advice.filter((it) => it.level === 'care'),
  ];
  return (
    <ul className="grid gap-3">
      {sorted.map((it) => (
        <li key={`${it.code} ${it.about}`} className="flex gap-3">
          <ToneGlyph tone={it.level === 'stop' ? 'berry' : 'butter'} className="mt-0.5" />
          <p>
            <span className="font-semibold">{it.sentence}</span>
            {it.instead !== '' && ` ${it.instead}`}
          </p>
        </li>
      ))}
    </ul>
  );
}
