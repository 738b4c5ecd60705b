import type { Reach } from '#shared/kitchen/colour.ts';
import { classNames } from '#web/lib/class-names.ts';
import { ToneGlyph, type Tone } from '#web/components/ui/notice.tsx';
import { reachWords } from './reach-words.ts';

const tones: Readonly<Record<Reach, Tone>> = {
  close: 'leaf',
  shifts: 'butter',
  'not-on-this-base': 'berry',
};

/** How near a colour comes: a mark and the word. */
export function ReachMark({ reach }: { readonly reach: Reach }) {
  return (
    <span
      className={classNames(
        'inline-flex items-center gap-1.5 text-sm font-semibold',
        reach === 'not-on-this-base' && 'text-berry',
      )}
    >
      <ToneGlyph tone={tones[reach]} className="size-4" />
      {reachWords[reach]}
    </span>
  );
}
