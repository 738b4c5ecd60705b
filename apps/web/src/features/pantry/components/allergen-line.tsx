import type { AllergenEntry } from '#shared/contracts/menu.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { formatList } from '#shared/dates/format.ts';
import { allergenLabel } from '#shared/kitchen/allergen-names.ts';
import { ToneGlyph } from '#web/components/ui/notice.tsx';

type Props = {
  readonly allergens: readonly AllergenEntry[];
  readonly region: LabelRegion;
  /** Said where the label names none. */
  readonly none?: string;
};

/** What something contains, may contain and leaves unknown; unknown stands in berry, with its mark. */
export function AllergenLine({ allergens, region, none = 'None named on the label' }: Props) {
  const inState = (state: AllergenEntry['state']) =>
    allergens.filter((it) => it.state === state).map((it) => allergenLabel(it, region));
  const contains = inState('contains');
  const may = inState('may-contain');
  const unknown = inState('unknown');
  return (
    <span className="grid gap-0.5">
      {contains.length > 0 && <span>{formatList(contains)}</span>}
      {may.length > 0 && <span className="text-sm text-slate">may contain {formatList(may)}</span>}
      {unknown.length > 0 && (
        <span className="flex items-start gap-1.5 text-sm font-semibold text-berry">
          <ToneGlyph tone="berry" className="mt-0.5 size-4" />
          {unknown.length > 4
            ? `unknown: ${unknown.length} allergens`
            : `unknown: ${formatList(unknown)}`}
        </span>
      )}
      {contains.length + may.length + unknown.length === 0 && (
        <span className="text-slate">{none}</span>
      )}
    </span>
  );
}
