import { useCallback, useDeferredValue, useEffect, useMemo, useState } from 'react';
import type { Design } from '#shared/contracts/design.ts';
import type { Estimate, EstimateRequest } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import type { OrderForm } from '../draft/empty-order.ts';

type Evaluate = (request: EstimateRequest, menu: Menu, today: string) => Estimate;

export type RunningEstimate = {
  /** Null before there is a design, or while the rules are loading. */
  readonly estimate: Estimate | null;
  /** The rules could not be loaded; `retry` asks for them again. */
  readonly failed: boolean;
  readonly retry: () => void;
};

/** The kitchen's rules are not needed on the first step of a new order, so they load apart. */
const loadRules = () => import('#shared/kitchen/evaluate-design.ts');

/** The estimate of the design, worked out in the browser as the customer chooses. */
export function useEstimate(
  design: Design | null,
  { date, windowStart }: Pick<OrderForm['day'], 'date' | 'windowStart'>,
  today: LocalDate,
  menu: Menu,
  wanted: boolean,
): RunningEstimate {
  const [evaluate, setEvaluate] = useState<{ readonly run: Evaluate } | null>(null);
  const [failed, setFailed] = useState(false);
  const [tries, setTries] = useState(0);

  useEffect(() => {
    if (!wanted) return undefined;
    let here = true;
    loadRules().then(
      (rules) => here && setEvaluate({ run: rules.evaluateDesign }),
      () => here && setFailed(true),
    );
    return () => {
      here = false;
    };
  }, [wanted, tries]);

  const retry = useCallback(() => {
    setFailed(false);
    setTries((count) => count + 1);
  }, []);

  const unhurried = useDeferredValue(design);
  const estimate = useMemo(() => {
    if (evaluate === null || unhurried === null || !wanted) return null;
    try {
      return evaluate.run({ design: unhurried, date, collectAt: windowStart }, menu, today);
    } catch {
      // The menu changed under the draft; it is fitted to the new one in the same moment.
      return null;
    }
  }, [evaluate, unhurried, date, windowStart, menu, today, wanted]);

  return { estimate, failed, retry };
}
