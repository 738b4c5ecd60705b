import { useId } from 'react';
import { formatList } from '#shared/dates/format.ts';
import { allergenName } from '#shared/kitchen/allergen-names.ts';
import { isAbout, isListed } from '#shared/kitchen/clashes.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { Button } from '#web/components/ui/button.tsx';
import { VisuallyHidden } from '#web/components/ui/visually-hidden.tsx';
import { declaredName } from '../../design/contains.ts';
import { dietWords } from '../../design/diet-words.ts';
import { applyPatch } from '../../design/edit-cake.ts';
import { useSuitableCakes } from '../../wizard/use-suitable-cakes.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { Verdict } from '../setting/verdict.tsx';

/**
 * Whole cakes for the guests that were told of: what suits by its ingredients and holds on the day,
 * what the kitchen handles all the same, and that a baker comes first. Nothing where nothing was
 * told.
 */
export function SuitableCakes() {
  const { menu, values, design, change } = useWizard();
  const cakes = useSuitableCakes();
  const title = useId();
  if (cakes === null) return null;
  const region = menu.studio.labelRegion;
  const { allergies, diets } = values.day;
  const listed = allergies.filter(isListed);
  const avoided = [...new Set(listed.map((it) => declaredName(it, region)))];
  const ways = diets.map((it) => dietWords[it]);
  const handled = [
    ...new Set(
      listed
        .filter((it) => menu.studio.handles.some((entry) => isAbout(entry, it)))
        .map((it) => allergenName(it.allergen, region)),
    ),
  ];
  return (
    <section
      aria-labelledby={title}
      className="grid gap-3 rounded-action border border-seam px-4 py-4 sm:px-5"
    >
      <h2 id={title}>Whole cakes for your table</h2>
      {cakes.length === 0 ? (
        <p className="measure">
          No whole cake on our menu goes without{' '}
          {avoided.length > 0 ? formatList(avoided) : 'what you told us of'}
          {ways.length > 0 && `, ${formatList(ways)}`}. Send it as it is or write to us: a baker
          looks for a way with you before anything is promised.
        </p>
      ) : (
        <>
          {avoided.length === 0 && ways.length > 0 && (
            <p className="measure">
              By their ingredients these go with what you told us: {formatList(ways)}. Best for your
              day first.
            </p>
          )}
          {avoided.length > 0 && (
            <p className="measure">
              By their ingredients none of these contains {formatList(avoided)}: not in the sponge,
              the filling or what goes over it. Best for your day first.
            </p>
          )}
          <ul className="grid gap-3">
            {cakes.map((it) => {
              const { way } = it;
              return (
                <li key={it.name} className="grid justify-items-start gap-0.5">
                  <p className="font-semibold">{it.name}</p>
                  {design?.setting ? (
                    <Verdict level={it.level} sentence={it.holds} />
                  ) : (
                    <p className="text-sm text-slate">{it.holds}</p>
                  )}
                  {it.contains.length > 0 && (
                    <p className="text-sm text-slate">Contains {formatList(it.contains)}.</p>
                  )}
                  {way !== null &&
                    (way.changes.length === 0 ? (
                      <p className="text-sm font-semibold text-leaf">This is your cake.</p>
                    ) : (
                      <Button
                        kind="quiet"
                        className="-ml-2 text-sm"
                        onClick={() => {
                          const { cake, look } = applyPatch(values, way.patch);
                          change({ cake, look }, `Changed: ${it.name}.`);
                        }}
                      >
                        Make it this
                        <VisuallyHidden>: {it.name}</VisuallyHidden>
                        {it.totalMinor !== null &&
                          `, ${formatMoney(it.totalMinor, menu.priceBook.currency, menu.studio.locale)}`}
                      </Button>
                    ))}
                </li>
              );
            })}
          </ul>
        </>
      )}
      {handled.length > 0 && (
        <p className="measure text-sm">
          <strong>
            We handle {formatList(handled)} in this kitchen, so traces can get into any cake.
          </strong>{' '}
          A baker reads what you told us before anything is promised, and talks it over with you
          wherever it needs it.
          {listed.length > 0 && ' Your guest and their doctor decide what they eat.'}
        </p>
      )}
    </section>
  );
}
