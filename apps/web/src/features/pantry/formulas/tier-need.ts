import type { Menu, TierSize } from '#shared/contracts/menu.ts';
import type { Formula, FormulaVersion, PartFormulas } from '#shared/contracts/pantry.ts';
import { amountsOfBody } from '#shared/kitchen/amounts.ts';
import type { ResolvedBody } from '#shared/kitchen/resolve-design.ts';
import { areaMm2 } from '#shared/kitchen/sizes.ts';

/** Some tiers alike: how many, of which size and height, with how many layers of sponge. */
export type Tiers = {
  readonly count: number;
  readonly size: TierSize;
  readonly heightMm: number;
  readonly layers: number;
};

/** What of a tier a formula makes; null for one that no tier takes by itself. */
export function tierRole(
  formula: Formula,
  parts: PartFormulas,
): 'sponge' | 'filling' | 'buttercream' | 'covering' | null {
  if (formula.kind === 'sponge') return 'sponge';
  if (formula.kind === 'buttercream') return 'buttercream';
  if (Object.values(parts.coverings).includes(formula.id)) return 'covering';
  return formula.kind === 'filling' || Object.values(parts.fillings).includes(formula.id)
    ? 'filling'
    : null;
}

/**
 * Grams of a formula that must come out of it for some plain tiers, smooth and on their own: a
 * sponge as it leaves the oven, before levelling. Null where no tier takes it, or the menu has
 * nothing of its kind to say how thick it lies.
 */
export function tierNeedG(
  formula: Formula,
  version: FormulaVersion,
  tiers: Tiers,
  menu: Menu,
  parts: PartFormulas,
): number | null {
  const role = tierRole(formula, parts);
  if (role === null) return null;
  const body = bodyFor(role, formula, version, tiers, menu, parts);
  if (body === null) return null;
  const amounts = amountsOfBody(
    body,
    { visibleTopMm2: areaMm2(body.block), pipedG: 0 },
    menu.kitchen,
  );
  const each = {
    sponge: amounts.batterG * (1 - version.bakeLossPpm / 1e6),
    filling: amounts.fillingG,
    buttercream: amounts.frostingG,
    covering: amounts.coveringG,
  }[role];
  return each * tiers.count;
}

function bodyFor(
  role: NonNullable<ReturnType<typeof tierRole>>,
  { id }: Formula,
  { densityGPerMl, bakeLossPpm }: FormulaVersion,
  { size, heightMm, layers }: Tiers,
  menu: Menu,
  parts: PartFormulas,
): ResolvedBody | null {
  const made = <T extends { readonly id: string }>(
    sold: readonly T[],
    by: Readonly<Record<string, string | undefined>>,
  ) => sold.find((it) => by[it.id] === id) ?? sold[0] ?? null;
  const plain: ResolvedBody = {
    block: { shape: size.shape, widthMm: size.widthMm, depthMm: size.depthMm, heightMm },
    layers,
    real: true,
    keepsake: false,
    sponge: null,
    filling: null,
    coating: null,
  };
  // A sponge gives way to the filling between its layers, whichever that is.
  const filling = made(menu.fillings, parts.fillings);
  if (role === 'sponge') {
    const sponge = made(menu.sponges, parts.sponges);
    if (sponge === null) return null;
    return { ...plain, filling, sponge: { ...sponge, densityGPerMl, bakeLossPpm } };
  }
  if (role === 'filling') {
    return filling === null ? null : { ...plain, filling: { ...filling, densityGPerMl } };
  }
  const coat = { finish: 'smooth', colour: null } as const;
  if (role === 'buttercream') {
    const style = made(menu.styles, parts.styles);
    const covering = menu.coverings.find((it) => it.id === 'buttercream');
    if (style === null || covering === undefined) return null;
    return { ...plain, coating: { ...coat, covering, style: { ...style, densityGPerMl } } };
  }
  const covering = menu.coverings.find((it) => parts.coverings[it.id] === id);
  if (covering === undefined) return null;
  return {
    ...plain,
    coating: {
      ...coat,
      covering: { ...covering, densityGPerMl },
      style: covering.id === 'fondant' ? (menu.styles[0] ?? null) : null,
    },
  };
}
