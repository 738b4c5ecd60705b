import type { Estimate } from '#shared/contracts/estimates.ts';
import { formatList } from '#shared/dates/format.ts';
import { allergenLabel } from '#shared/kitchen/allergen-names.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

const verbs = {
  contains: 'in',
  'may-contain': 'may be in',
  unknown: 'the label does not say, of',
  'not-declared': 'not declared, of',
} as const;

/** What the whole cake contains, from which parts, and what else the kitchen handles. */
export function AllergenSummary({ estimate }: { readonly estimate: Estimate }) {
  const { studio } = useWizard().menu;
  const region = studio.labelRegion;
  const said = estimate.allergens.filter((it) => it.state !== 'not-declared');
  const inCake = new Set(said.filter((it) => it.state === 'contains').map((it) => it.allergen));
  const handled = estimate.handled.filter((it) => !inCake.has(it.allergen));
  return (
    <section className="grid gap-2" aria-labelledby="allergens-heading">
      <h2 id="allergens-heading">Made with</h2>
      <ul className="grid gap-1">
        {said.map((it) => (
          <li key={it.allergen}>
            <strong>{capitalise(allergenLabel(it, region))}</strong>: {verbs[it.state]}{' '}
            {formatList(it.parts)}.
          </li>
        ))}
      </ul>
      {handled.length > 0 && (
        <p>
          Our kitchen also handles {formatList(handled.map((it) => allergenLabel(it, region)))}.
        </p>
      )}
      <p className="text-sm text-slate">{studio.kitchenNotice}</p>
    </section>
  );
}
