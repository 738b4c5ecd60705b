import type { Estimate, EstimateRequest } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { today } from '#shared/dates/local-time.ts';
import { evaluateDesign } from '#shared/kitchen/evaluate-design.ts';
import { UnknownPart } from '#shared/kitchen/unknown-part.ts';
import { invalidField } from '#api/platform/app-error.ts';

type Path = readonly (string | number)[];

/**
 * The estimate of a design by a menu, on the studio's day.
 * @param fieldOf leads from a path inside the design to the field of the request it came from
 * @throws `invalid-input` at the field that names what the menu does not have
 */
export function estimateDesign(
  request: EstimateRequest,
  { menu, now, fieldOf }: { menu: Menu; now: Date; fieldOf: (path: Path) => Path },
): Estimate {
  try {
    return evaluateDesign(request, menu, today(now, menu.studio.zone));
  } catch (error) {
    if (!(error instanceof UnknownPart)) throw error;
    throw invalidField(
      fieldOf(error.path),
      'This is not on the menu any more; please choose another.',
    );
  }
}
