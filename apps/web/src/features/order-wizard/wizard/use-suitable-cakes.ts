import { useDeferredValue, useEffect, useMemo, useState } from 'react';
import type { EstimateRequest } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import type { SuitableCake } from '#shared/kitchen/suitable-cakes.ts';
import { useWizard } from './wizard-context.ts';

type Find = (request: EstimateRequest, menu: Menu, today: string) => SuitableCake[];

/** With the kitchen's other rules, which load after the first step. */
const loadRules = () => import('#shared/kitchen/suitable-cakes.ts');

/**
 * Whole cakes of the menu for the guests that were told of; null while the rules load, or where
 * nothing was told that speaks against any.
 */
export function useSuitableCakes(): SuitableCake[] | null {
  const { design, values, menu, today } = useWizard();
  const { allergies, diets, susceptible, infants } = values.day;
  const wanted =
    allergies.some((it) => it.allergen !== null) || diets.length > 0 || susceptible || infants;
  const [find, setFind] = useState<{ readonly run: Find } | null>(null);

  useEffect(() => {
    if (!wanted) return undefined;
    let here = true;
    loadRules().then(
      (rules) => here && setFind({ run: rules.suitableCakes }),
      // The list is a help beside the advice; without it the advice still stands.
      () => undefined,
    );
    return () => {
      here = false;
    };
  }, [wanted]);

  const unhurried = useDeferredValue(design);
  const { date } = values.day;
  return useMemo(() => {
    if (find === null || unhurried === null || !wanted) return null;
    try {
      return find.run({ design: unhurried, date }, menu, today);
    } catch {
      // The menu changed under the draft; it is fitted to the new one in the same moment.
      return null;
    }
  }, [find, unhurried, date, menu, today, wanted]);
}
