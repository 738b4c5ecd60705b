import { ToneGlyph } from '#web/components/ui/notice.tsx';
import type { Verdict } from './judge-part.ts';

/** Why a part falls away or asks for care; nothing where nothing speaks against it. */
export function VerdictLine({ verdict: { level, reasons } }: { readonly verdict: Verdict }) {
  if (reasons.length === 0) return null;
  const stop = level === 'stop';
  return (
    <p className="flex gap-2 text-sm font-semibold">
      <ToneGlyph tone={stop ? 'berry' : 'butter'} />
      <span className={stop ? 'text-berry' : undefined}>
        {stop ? 'Falls away. ' : 'With care. '}
        {reasons.join('. ')}.
      </span>
    </p>
  );
}
