import type { Estimate } from '#shared/contracts/estimates.ts';
import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import { formatList } from '#shared/dates/format.ts';
import { allergenLabel } from '#shared/kitchen/allergen-names.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';

type Props = {
  readonly offer: Estimate;
  readonly region: LabelRegion;
  readonly kitchenNotice: string;
};

/** What is in the cake and what else the kitchen handles; never what it is without. */
export function MadeWith({ offer, region, kitchenNotice }: Props) {
  const inIt = offer.allergens.filter((it) => it.state === 'contains');
  const warned = offer.allergens.filter(
    (it) => it.state !== 'contains' && it.state !== 'not-declared',
  );
  const names = new Set(inIt.map((it) => it.allergen));
  const others = offer.handled.filter((it) => !names.has(it.allergen));
  return (
    <div className="grid gap-2">
      {inIt.length > 0 && (
        <p>
          <strong>{capitalise(formatList(inIt.map((it) => allergenLabel(it, region))))}.</strong>
          {others.length > 0 &&
            ` Our kitchen also handles ${formatList(others.map((it) => allergenLabel(it, region)))}.`}
        </p>
      )}
      <ul className="grid gap-1 text-sm text-slate">
        {inIt.map((it) => (
          <li key={it.allergen}>
            {capitalise(allergenLabel(it, region))}: in {formatList(it.parts)}.
          </li>
        ))}
        {warned.map((it) => (
          <li key={it.allergen}>
            {it.state === 'may-contain' ? 'May contain ' : 'The label does not settle '}
            {allergenLabel(it, region)}: {formatList(it.parts)}.
          </li>
        ))}
      </ul>
      <p className="text-sm text-slate">{kitchenNotice}</p>
    </div>
  );
}
