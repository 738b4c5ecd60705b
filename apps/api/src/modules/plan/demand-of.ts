import type { Design } from '#shared/contracts/design.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import { expandDesign } from '#shared/dates/expand-design.ts';
import type { Demand } from '#shared/dates/model.ts';
import { typicalDesign } from '#shared/dates/typical-design.ts';
import { resolveDesign } from '#shared/kitchen/resolve-design.ts';
import { UnknownPart } from '#shared/kitchen/unknown-part.ts';
import { invalidField } from '#api/platform/app-error.ts';
import type { PlanSettings } from './plan-settings.ts';

export type PlanQuestion = {
  readonly demand: Demand;
  /** Worked out for a typical cake, because the design is not complete. */
  readonly likely: boolean;
};

/**
 * What a design needs of the bench; what is not chosen yet is filled in with a typical choice.
 * @throws `invalid-input` at the part that is not on the menu
 */
export function demandOf(design: Design, menu: Menu, settings: PlanSettings): PlanQuestion {
  try {
    const { design: whole, likely } = typicalDesign(design, menu);
    const resolved = resolveDesign(whole, menu);
    const kinds = [
      whole.cake?.kind ?? 'tiered',
      ...((whole.cake?.cuttingCakes ?? []).length > 0 ? ['cutting'] : []),
      ...(whole.extras.length > 0 ? ['extra'] : []),
    ];
    const notice = [
      ...kinds.map((kind) => settings.noticeByItem.get(kind) ?? 0),
      settings.noticeByOccasion.get(design.guests.occasionId) ?? 0,
    ];
    const { workTimes, equipment } = settings;
    const noticeDays = Math.max(...notice);
    return { demand: expandDesign({ resolved, workTimes, equipment, noticeDays }), likely };
  } catch (error) {
    if (!(error instanceof UnknownPart)) throw error;
    throw invalidField(
      ['design', ...error.path],
      'This is not on the menu any more; please choose another.',
    );
  }
}
