import type { Estimate, EstimateRequest } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { today } from '#shared/dates/local-time.ts';
import { evaluateDesign } from '#shared/kitchen/evaluate-design.ts';
import { UnknownPart } from '#shared/kitchen/unknown-part.ts';
import { invalidField } from '#api/platform/app-error.ts';

type Path = readonly (string | number)[];

/**
 * The last estimates by each menu. A design is asked about again and again: whenever its page is
 * opened, and once more when the order is sent.
 */
const kept = new WeakMap<Menu, Map<string, Estimate>>();
const mostKept = 200;

/**
 * The estimate of a design by a menu, on the studio's day.
 * @param fieldOf leads from a path inside the design to the field of the request it came from
 * @throws `invalid-input` at the field that names what the menu does not have
 */
export function estimateDesign(
  request: EstimateRequest,
  { menu, now, fieldOf }: { menu: Menu; now: Date; fieldOf: (path: Path) => Path },
): Estimate {
  const day = today(now, menu.studio.zone);
  const known = kept.get(menu) ?? new Map<string, Estimate>();
  kept.set(menu, known);
  const key = JSON.stringify([day, request]);
  const before = known.get(key);
  if (before !== undefined) return before;
  try {
    const estimate = evaluateDesign(request, menu, day);
    const oldest = known.keys().next();
    if (known.size >= mostKept && oldest.done !== true) known.delete(oldest.value);
    known.set(key, estimate);
    return estimate;
  } catch (error) {
    if (!(error instanceof UnknownPart)) throw error;
    throw invalidField(
      fieldOf(error.path),
      'This is not on the menu any more; please choose another.',
    );
  }
}
