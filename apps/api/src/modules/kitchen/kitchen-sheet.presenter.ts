import type {
  KitchenFormula,
  KitchenPiece,
  KitchenSheet,
} from '#shared/contracts/kitchen-sheet.ts';
import { eggsAlone } from '#shared/kitchen/eggs/joint-plan.ts';
import { coolingMinutes } from '#shared/kitchen/formulas/bowls.ts';
import { formatHousehold } from '#shared/kitchen/formulas/household.ts';
import type { HouseholdUnits } from '#shared/kitchen/formulas/household.ts';
import { currentVersion } from '#shared/kitchen/formulas/pantry-index.ts';
import type { PantryIndex } from '#shared/kitchen/formulas/pantry-index.ts';
import type { FormulaNeed, UnknownNeed } from '#shared/kitchen/needs/kitchen-needs.ts';
import { partName } from '#shared/kitchen/needs/part-name.ts';
import { partWeights } from '#shared/kitchen/part-weights.ts';
import type { PieceWeights } from '#shared/kitchen/part-weights.ts';
import type { ResolvedDesign } from '#shared/kitchen/resolve-design.ts';
import { tierName } from '#shared/kitchen/tier-name.ts';
import type { OrderNeeds } from './order-needs.queries.ts';

/** What goes into an order, as the bench reads it. */
export function presentKitchenSheet(
  { order, resolved, needs }: OrderNeeds,
  index: PantryIndex,
): KitchenSheet {
  const { lengthLead } = resolved.menu.studio;
  const units: HouseholdUnits = lengthLead === 'in' ? 'us' : 'metric';
  const weights = partWeights(resolved);
  const decorations = weights.parts.filter((it) => it.part === 'decoration');
  return {
    number: order.number,
    pieces: [
      ...weights.pieces.map((it) => presentPiece(it, resolved)),
      ...(decorations.length === 0
        ? []
        : [
            {
              kind: 'decorations' as const,
              name: 'Decorations',
              count: 1,
              parts: decorations.map((it) => presentPart(it, resolved)),
            },
          ]),
    ],
    formulas: needs.formulas.map((it) => presentFormula(it, index, units)),
    ingredients: needs.ingredients.map(({ ingredient, grams }) => ({
      id: ingredient.id,
      name: ingredient.name,
      brand: ingredient.brand,
      grams,
      household: formatHousehold(ingredient, grams, units),
      packs: ingredient.pack === null ? null : grams / ingredient.pack.grams,
    })),
    eggs: eggsAlone(needs.ingredients),
    unknown: needs.unknown.map(presentUnknown),
  };
}

export function presentUnknown({ name, grams, message }: UnknownNeed) {
  return { name, grams, message };
}

function presentPiece(piece: PieceWeights, resolved: ResolvedDesign): KitchenPiece {
  return {
    kind: piece.kind,
    name: pieceName(piece, resolved),
    count: piece.count,
    parts: piece.parts.map((it) => presentPart(it, resolved)),
  };
}

function presentPart(
  part: PieceWeights['parts'][number],
  resolved: ResolvedDesign,
): KitchenPiece['parts'][number] {
  return {
    part: part.part,
    name: partName(part, resolved.menu),
    inCakeG: part.inCakeG,
    toMakeG: part.toMakeG,
  };
}

function pieceName({ kind, index }: PieceWeights, resolved: ResolvedDesign): string {
  if (kind === 'sheet') return 'The sheet';
  if (kind === 'tier') return tierName(index, resolved.tiers.length);
  return `Cutting cake: ${resolved.cuttingCakes[index]?.size.name ?? ''}`;
}

function presentFormula(
  need: FormulaNeed,
  index: PantryIndex,
  units: HouseholdUnits,
): KitchenFormula {
  const { version, scaled, bowls } = need;
  const today = currentVersion(index, version.formulaId);
  return {
    versionId: version.id,
    formulaId: version.formulaId,
    name: need.name,
    n: version.n,
    newer: today === null || today.id === version.id ? null : today.n,
    kind: index.formulas.get(version.formulaId)?.kind ?? 'other',
    for: [...need.for],
    outG: need.outG,
    mixG: need.mixG,
    roundedInG: scaled.roundedInG,
    driftG: scaled.driftG,
    lines: scaled.lines.map(({ part, exactG, roundedG, driftG, eggs }) => ({
      name: part.name,
      formula: part.kind === 'formula',
      exactG,
      roundedG,
      driftG,
      household:
        part.kind === 'ingredient' ? formatHousehold(part.ingredient, roundedG, units) : null,
      eggs: eggs?.count ?? null,
    })),
    bowls:
      bowls === null
        ? null
        : {
            mixer: bowls.mixer.name,
            bowls: bowls.bowls,
            eachG: bowls.eachG,
            coolingMinutes: coolingMinutes(version, index, bowls.eachG),
          },
    pasteurised: version.pasteurisedByDefault,
  };
}
