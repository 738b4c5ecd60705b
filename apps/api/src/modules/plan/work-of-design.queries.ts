import { expandDesign } from '#shared/dates/expand-design.ts';
import type { Work } from '#shared/dates/model.ts';
import type { ResolvedDesign } from '#shared/kitchen/resolve-design.ts';
import { loadPlanSettings, loadWorkTimes } from './plan-settings.ts';

/** The work of a design; none before there is a cake. */
export type WorkOf = (resolved: ResolvedDesign) => readonly Work[];

/** How designs are expanded into work by a version of the studio's times. */
export async function workByTimes(workTimeVersionId: string): Promise<WorkOf> {
  const [workTimes, { equipment }] = await Promise.all([
    loadWorkTimes(workTimeVersionId),
    loadPlanSettings(),
  ]);
  return (resolved) =>
    resolved.design.cake === null
      ? []
      : expandDesign({ resolved, workTimes, equipment, noticeDays: 0 }).work;
}
