import { formulaKind, type FormulaKind } from '#shared/contracts/pantry.ts';
import { resolvePart } from '#shared/kitchen/formulas/pantry-index.ts';
import type { KeptFormula, Shelf } from '../shelf.ts';

export type FormulaSearch = {
  readonly find: string;
  readonly kind: FormulaKind | null;
  readonly archived: boolean;
};

/** What the address asks for; anything it does not know is left out. */
export function readFormulaSearch(search: URLSearchParams): FormulaSearch {
  const kind = formulaKind.safeParse(search.get('kind'));
  return {
    find: search.get('find') ?? '',
    kind: kind.success ? kind.data : null,
    archived: search.get('archived') === 'yes',
  };
}

export function writeFormulaSearch({ find, kind, archived }: FormulaSearch): string {
  const out = new URLSearchParams();
  if (find !== '') out.set('find', find);
  if (kind !== null) out.set('kind', kind);
  if (archived) out.set('archived', 'yes');
  return out.toString();
}

const kindOrder = ['buttercream', 'sponge', 'filling', 'custard', 'other'] as const;

/** The formulas asked for, by kind and name; found by their own name or by what is in them. */
export function findFormulas(shelf: Shelf, search: FormulaSearch): readonly KeptFormula[] {
  const words = search.find.toLowerCase().split(/\s+/).filter(Boolean);
  return [...shelf.formulas.values()]
    .filter(({ formula }) => (formula.archivedAt !== null) === search.archived)
    .filter(({ formula }) => search.kind === null || formula.kind === search.kind)
    .filter(({ formula, current }) => {
      const inside = current.lines.map(({ part }) => resolvePart(shelf.index, part).name);
      const text = `${formula.name} ${inside.join(' ')}`.toLowerCase();
      return words.every((word) => text.includes(word));
    })
    .toSorted(
      (a, b) =>
        kindOrder.indexOf(a.formula.kind) - kindOrder.indexOf(b.formula.kind) ||
        a.formula.name.localeCompare(b.formula.name),
    );
}
