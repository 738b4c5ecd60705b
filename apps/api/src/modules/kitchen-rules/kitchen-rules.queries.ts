import { createHash } from 'node:crypto';
import type { KitchenSettings } from '#shared/contracts/kitchen-rules.ts';
import { kitchenOf } from '#api/db/kitchen-of.ts';
import { Studio } from '#api/db/models/studio.ts';

/** The kitchen's figures and those of the studio beside them, as they are kept. */
export async function loadKitchenRules(): Promise<KitchenSettings> {
  const studio = await Studio.findByPk(1, { rejectOnEmpty: true });
  const { altitudeM, monthlyWarmestC, dessertFactorPpm, wordsPerDecimetre } = studio;
  const settings = {
    rules: kitchenOf(studio),
    altitudeM,
    monthlyWarmestC,
    dessertFactorPpm,
    wordsPer100Mm: wordsPerDecimetre,
  };
  const version = createHash('sha256').update(JSON.stringify(settings)).digest('base64url');
  return { version: version.slice(0, 16), ...settings };
}
