import { literal } from 'sequelize';
import { PlanState } from './models/plan-state.ts';

/** There is one row. */
const only = { id: 1 };

/** What answers were worked out with. */
export type PlanVersions = {
  readonly planVersion: number;
  readonly settingsVersion: number;
  readonly catalogueVersion: number;
};

/** The versions as they are now; the row has been there since the first migration. */
export async function readPlanVersions(): Promise<PlanVersions> {
  const { planVersion, settingsVersion, catalogueVersion } = await PlanState.findByPk(1, {
    rejectOnEmpty: true,
  });
  return { planVersion, settingsVersion, catalogueVersion };
}

/**
 * Takes the next version of the plan if it still is the one a plan was made at. Every write to
 * tasks, batches, assignments, holds or shifts does this, in the same transaction.
 * @param madeAt the version planned at; left out where the write holds whatever the plan is
 * @returns false when the plan has changed meanwhile: plan again
 */
export async function takeNextPlanVersion(madeAt?: number): Promise<boolean> {
  const where = madeAt === undefined ? only : { ...only, planVersion: madeAt };
  const [changed] = await PlanState.update({ planVersion: literal('plan_version + 1') }, { where });
  return changed === 1;
}

/** Says that hours, people, equipment or rules have changed: the plan's answers are stale too. */
export async function noteSettingsChange(): Promise<void> {
  await PlanState.update(
    {
      settingsVersion: literal('settings_version + 1'),
      planVersion: literal('plan_version + 1'),
    },
    { where: only },
  );
}

/** Says that the menu, prices or policies have changed. */
export async function noteCatalogueChange(): Promise<void> {
  await PlanState.update({ catalogueVersion: literal('catalogue_version + 1') }, { where: only });
}
