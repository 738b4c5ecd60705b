import { usualKitchen, type SaveKitchenRules } from '#shared/contracts/kitchen-rules.ts';
import { Studio } from '#api/db/models/studio.ts';
import { noteCatalogueChange, noteSettingsChange } from '#api/db/plan-versions.ts';
import { inTransaction } from '#api/db/transaction.ts';
import { noteAudit } from '#api/modules/note-audit.ts';
import type { Staff } from '#api/platform/actor.ts';
import { AppError } from '#api/platform/app-error.ts';
import { loadKitchenRules } from './kitchen-rules.queries.ts';

/**
 * Puts the kitchen's figures in place of the present ones: menu, estimates and planner go by them
 * at once, orders that were sent keep what they were offered. Only what differs from the usual is
 * kept, so that a studio that never set a figure goes on by the usual one.
 * @throws `changed-meanwhile` when somebody else saved since `version` was read
 */
export async function saveKitchenRules(actor: Staff, wanted: SaveKitchenRules): Promise<void> {
  await inTransaction(async () => {
    const before = await loadKitchenRules();
    if (before.version !== wanted.version) throw new AppError('changed-meanwhile');
    const { rules, altitudeM, monthlyWarmestC, dessertFactorPpm, wordsPer100Mm } = wanted;
    const usual: Readonly<Record<string, number>> = usualKitchen;
    const kitchen = Object.fromEntries(
      Object.entries(rules).filter(([name, value]) => value !== usual[name]),
    );
    await Studio.update(
      {
        kitchen,
        altitudeM,
        monthlyWarmestC,
        dessertFactorPpm,
        wordsPerDecimetre: wordsPer100Mm,
      },
      { where: { id: 1 } },
    );
    await noteCatalogueChange();
    // The room a tier takes in the fridge is in the plan's own answers.
    await noteSettingsChange();
    await noteAudit(actor, {
      action: 'save-kitchen-rules',
      subjectKind: 'kitchen-rules',
      subjectId: '1',
      data: { own: Object.keys(kitchen).length },
    });
  });
}
