import type { FormulaLine } from '#shared/contracts/pantry.ts';
import { type PantryIndex, resolvePart } from '#shared/kitchen/formulas/pantry-index.ts';
import type { PercentBase } from '#shared/kitchen/formulas/percents.ts';

/** `flour`, `butter` or `line-3`: what a percent view is a percentage of, as a list's value. */
export type PercentChoice = string;

type Lines = { readonly lines: readonly FormulaLine[] };

/** What lines can be a percentage of; flour and butter only where there is some. */
export function percentChoices(
  { lines }: Lines,
  index: PantryIndex,
): readonly { readonly value: PercentChoice; readonly label: string }[] {
  const parts = lines.map(({ part }) => resolvePart(index, part));
  const has = (family: string) =>
    parts.some((it) => it.kind === 'ingredient' && it.ingredient.family === family);
  return [
    ...(has('flour') ? [{ value: 'flour', label: 'the flour' }] : []),
    ...(has('butter') ? [{ value: 'butter', label: 'the butter' }] : []),
    ...parts.map((it, at) => ({ value: `line-${at}`, label: it.name })),
  ];
}

export function percentBase(choice: PercentChoice): PercentBase {
  if (choice === 'flour' || choice === 'butter') return { of: choice };
  return { of: 'line', line: Number(choice.replace('line-', '')) };
}
