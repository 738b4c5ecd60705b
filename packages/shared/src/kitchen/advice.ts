import type { Advice, Proposal } from '#shared/contracts/estimates.ts';
import { allergenAdvice } from './advice-allergens.ts';
import { cakeAdvice } from './advice-cake.ts';
import { dietAdvice } from './advice-diets.ts';
import { eatingAdvice } from './advice-eating.ts';
import { lookAdvice } from './advice-look.ts';
import { settingAdvice } from './advice-setting.ts';
import { changesOf } from './changes.ts';
import { byLevel } from './heat.ts';
import type { PortionCount } from './portions.ts';
import type { Situation } from './situation.ts';

/**
 * Everything worth saying about a design, sharpest first; what hurts people before what hurts
 * cakes. Nothing here ever promises that a cake will do no harm: it says what is in it.
 */
export function adviseOn(
  situation: Situation,
  portions: PortionCount,
  proposals: readonly Proposal[],
): Advice[] {
  const { design, menu } = situation.resolved;
  return [
    ...allergenAdvice(situation),
    ...eatingAdvice(situation),
    ...dietAdvice(situation),
    ...settingAdvice(situation),
    ...cakeAdvice(situation.resolved, portions, proposals),
    ...lookAdvice(situation),
  ]
    .sort((a, b) => byLevel(b.level, a.level))
    .map((it) => ({
      ...it,
      ways: it.ways.map(({ label, patch }) => ({
        label,
        changes: changesOf(design, patch, menu),
        patch,
      })),
    }));
}
