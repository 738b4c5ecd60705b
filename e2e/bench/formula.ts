import type { FormulaLine, FormulaVersion } from '#shared/contracts/pantry.ts';
import { compareVersions } from '#shared/kitchen/formulas/compare-versions.ts';
import { evaluateFormula } from '#shared/kitchen/formulas/evaluate-formula.ts';
import { indexPantry } from '#shared/kitchen/formulas/pantry-index.ts';
import { formatLine, readFormulaLine } from '#shared/kitchen/formulas/read-formula-text.ts';
import {
  bookOf,
  bought,
  shelf,
  version,
  type LineRow,
} from '#shared/kitchen/testing/pantry-fixture.ts';
import { atMost, median, type Figure, type Part } from './report.ts';

/*
 * A keystroke in the formula editor: every line read again as it is typed, the draft worked out
 * (weights, percents, household measures, cost, allergens) and compared with the version before.
 */

const lineCount = 60;

/** As many shelves as a studio has, and formulas that hold one another three levels deep. */
const stock = [
  ...shelf,
  ...Array.from({ length: 100 }, (_, n) =>
    bought(`more${n}`, `Studio flavor ${n}, a jar`, { pack: { grams: 250, priceMinor: 700 + n } }, [
      ['teaspoon', 4 + (n % 3)],
      ['cup', 200 + n],
    ]),
  ),
];
const ofShelf = (n: number): LineRow => [stock[n % stock.length]?.id ?? '', 10 + n];
const tenOf = (level: number, inner: string | null): readonly LineRow[] => [
  ...(inner === null ? [] : [[inner, 120] as const]),
  ...Array.from({ length: 10 }, (_, n) => ofShelf(level * 10 + n)),
];
const levels = [
  version('custard', tenOf(0, null), { yieldPpm: 950_000 }),
  version('cream', tenOf(1, '@custard-1'), { yieldPpm: 980_000 }),
  version('filling', tenOf(2, '@cream-1'), { yieldPpm: 970_000 }),
];
const names = { custard: 'Custard', cream: 'Custard cream', filling: 'Layered filling' };
const index = indexPantry(bookOf(stock, levels, names));

const before: FormulaVersion = version('house', [
  ['@filling-1', 500],
  ...Array.from({ length: lineCount - 1 }, (_, n) => ofShelf(n)),
]);

const nameOf = ({ part }: FormulaLine): string =>
  part.kind === 'ingredient'
    ? (index.ingredients.get(part.ingredientId)?.name ?? '')
    : names.filling;

/** The texts of an editor in which somebody has just typed another figure on one line. */
const typed = (keystroke: number) =>
  before.lines.map((it, at) =>
    formatLine(it.grams + (at === keystroke % lineCount ? keystroke % 7 : 0), nameOf(it)),
  );

function keystroke(texts: readonly string[]): void {
  const lines = texts.flatMap((asTyped): FormulaLine[] => {
    const { match, grams } = readFormulaLine(asTyped, index);
    return match === null || grams === null ? [] : [{ part: match.part, grams, asTyped, step: 0 }];
  });
  if (lines.length !== lineCount)
    throw new Error(`${lines.length} of ${lineCount} lines were read`);
  const draft = { ...before, lines, n: 2 };
  const asked = { draft, formulaId: 'house', name: 'House', percentOf: { of: 'flour' } as const };
  if (evaluateFormula(asked, index).contents === null) throw new Error('the draft is unsound');
  compareVersions(before, draft, index);
}

export const formula: Part = {
  name: 'formula',
  about: 'a keystroke in the editor, 60 lines with formulas three levels deep',
  run(note): Promise<readonly Figure[]> {
    const took = Array.from({ length: 300 }, (_, n) => {
      const texts = typed(n);
      const started = process.cpuUsage();
      keystroke(texts);
      // Time on the processor, so that what else runs there is not counted.
      const { user, system } = process.cpuUsage(started);
      return (user + system) / 1000;
    });
    note(`the first, before the compiler has learnt: ${took[0]?.toFixed(1)} ms`);
    return Promise.resolve([
      atMost('formula: a keystroke with 60 lines, ms', 16, median(took.slice(100))),
    ]);
  },
};
