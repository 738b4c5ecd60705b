import type { KitchenSheet } from '#shared/contracts/kitchen-sheet.ts';
import { gramsText } from '#web/lib/grams-text.ts';
import { BoughtList } from './bought-list.tsx';
import { FormulaSheet } from './formula-sheet.tsx';
import { PieceWeights } from './piece-weights.tsx';
import { UnknownNeeds } from './unknown-needs.tsx';

type Props = { readonly sheet: KitchenSheet; readonly locale: string };

/** Formulas side by side, as many as there is room for. */
export function FormulaSheets({ sheet, locale }: Props) {
  return (
    <div className="grid items-start gap-x-10 gap-y-8 lg:grid-cols-2 print:block print:columns-2 print:space-y-5">
      {sheet.formulas.map((formula) => (
        <FormulaSheet key={formula.versionId} formula={formula} locale={locale} />
      ))}
    </div>
  );
}

/** Weights by tier, and the eggs this order alone would take. */
export function KitchenSummary({ sheet, locale }: Props) {
  return (
    <div className="grid gap-4 print:block print:space-y-3">
      <UnknownNeeds unknown={sheet.unknown} locale={locale} />
      <PieceWeights pieces={sheet.pieces} locale={locale} />
      {sheet.eggs.crack > 0 && <p>{eggSentence(sheet, locale)}</p>}
    </div>
  );
}

/** Everything on a page of its own, to print and take to the bench. */
export function WholeSheet({ sheet, locale }: Props) {
  return (
    <div className="grid gap-8 print:block print:space-y-5">
      <KitchenSummary sheet={sheet} locale={locale} />
      <section className="grid gap-4 print:block print:space-y-3">
        <h2>Formulas</h2>
        <FormulaSheets sheet={sheet} locale={locale} />
      </section>
      <section className="grid gap-3 print:block print:space-y-2">
        <h2>All of it, as bought</h2>
        <BoughtList ingredients={sheet.ingredients} locale={locale} />
      </section>
    </div>
  );
}

function eggSentence({ eggs }: KitchenSheet, locale: string): string {
  const left = [
    eggs.leftWhiteG >= 1 ? `${gramsText(eggs.leftWhiteG, locale)} of whites` : '',
    eggs.leftYolkG >= 1 ? `${gramsText(eggs.leftYolkG, locale)} of yolks` : '',
  ].filter((it) => it !== '');
  const crack = `By itself it takes ${eggs.crack} large ${eggs.crack === 1 ? 'egg' : 'eggs'} in the shell`;
  return left.length === 0 ? `${crack}.` : `${crack} and leaves ${left.join(' and ')}.`;
}
