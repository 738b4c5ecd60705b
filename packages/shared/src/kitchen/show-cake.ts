import type { Cake } from '#shared/contracts/design.ts';
import type { WayOut } from './note.ts';
import { portionsWanted } from './portions.ts';
import { cuttingCakeOf, sheetsFor } from './propose-cutting.ts';
import { coatingName } from './resolve-design.ts';
import type { Coat, RankedCoat, Situation } from './situation.ts';
import { addsNoClash, sameCoat, withCoat } from './ways-out.ts';

/**
 * A dummy on show and plain cutting cakes kept cold in the kitchen: the same sponge and filling
 * for everybody, and a coat on the dummy that holds where it stands. Empty where there is no cake
 * with an inside, no sheet to cut, or no coat that holds.
 */
export function showWays(situation: Situation): WayOut[] {
  const { resolved } = situation;
  const { design, menu } = resolved;
  const { cake } = design;
  const inside = resolved.tiers.find((it) => it.real && !it.keepsake);
  if (cake === null || cake.kind !== 'tiered' || inside === undefined) return [];
  const kept = resolved.tiers.filter((it) => it.real).map((it) => it.coating);
  const coat = dressFor(situation);
  const cut = sheetsFor(portionsWanted(design.guests, menu), menu, resolved.portionSize);
  if (coat === null || cut === null || kept.some((it) => it === null)) return [];
  const cuttingCakes = [
    cuttingCakeOf(cut.size, cut.count, {
      spongeId: inside.sponge?.id ?? null,
      fillingId: inside.filling?.id ?? null,
    }),
  ];
  const dressed = withCoat(cake, (it) => !sameCoat(it, coat), coat);
  const shown: Cake = {
    ...dressed,
    tiers: dressed.tiers.map((it) => ({
      ...it,
      real: false,
      keepsake: false,
      spongeId: null,
      fillingId: null,
    })),
    cuttingCakes,
  };
  return [
    {
      label: `A dummy in ${coatingName(coat)} on show, and cutting cakes kept cold`,
      patch: { cake: shown },
    },
  ];
}

/** What the dummy wears: what it has where that holds, else the best coat that does. */
function dressFor(situation: Situation): Coat | null {
  const { resolved, coats } = situation;
  const worn = resolved.tiers.flatMap(({ coating }) => coating ?? []);
  const noWorse = addsNoClash(situation);
  const holding = coats.filter((it) => it.heat !== 'stop' && noWorse(it));
  const isWorn = (it: RankedCoat) =>
    worn.some((one) => one.covering.id === it.covering.id && one.style?.id === it.style?.id);
  // Over the style they chose, so that the cutting cakes taste of it.
  const overTheirs = (it: RankedCoat) => worn.some((one) => one.style?.id === it.style?.id);
  return holding.find(isWorn) ?? holding.find(overTheirs) ?? holding[0] ?? null;
}
