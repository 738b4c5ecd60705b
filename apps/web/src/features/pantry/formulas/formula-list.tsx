import { Link } from 'react-router-dom';
import type { Menu } from '#shared/contracts/menu.ts';
import {
  type EvaluatedFormula,
  evaluateFormula,
} from '#shared/kitchen/formulas/evaluate-formula.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import { paths } from '#web/config/paths.ts';
import { AllergenLine } from '../components/allergen-line.tsx';
import type { KeptFormula, Shelf } from '../shelf.ts';
import { FormulaDab } from './formula-dab.tsx';
import { kindWords, onTheMenu } from './formula-words.ts';

type Props = {
  readonly formulas: readonly KeptFormula[];
  readonly shelf: Shelf;
  readonly menu: Menu;
};

/** Every formula: what it is, what it contains, what a kilo costs, and where it is used. */
export function FormulaTable({ formulas, shelf, menu }: Props) {
  const costs = shelf.pantry.can.seeCost;
  return (
    <table className="w-full border-collapse">
      <caption className="sr-only">Formulas</caption>
      <thead className="text-left text-sm text-slate">
        <tr>
          <th scope="col" className="py-3 pr-3 pl-5 font-semibold">
            Formula
          </th>
          <th scope="col" className="px-3 py-3 font-semibold">
            Contains
          </th>
          <th scope="col" className="px-3 py-3 font-semibold">
            Used in
          </th>
          {costs && (
            <th scope="col" className="py-3 pr-5 pl-3 text-right font-semibold">
              Per kg
            </th>
          )}
        </tr>
      </thead>
      <tbody>
        {formulas.map((it) => {
          const seen = evaluated(it, shelf);
          return (
            <tr key={it.formula.id} className="border-t border-seam align-top hover:bg-cloud">
              <th scope="row" className="py-2 pr-3 pl-5 text-left font-normal">
                <FormulaLink kept={it} />
              </th>
              <td className="max-w-80 px-3 pt-3.5 pb-3">
                <Contains seen={seen} menu={menu} />
              </td>
              <td className="max-w-64 px-3 pt-3.5 pb-3 text-sm text-slate">
                <UsedIn kept={it} shelf={shelf} menu={menu} />
              </td>
              {costs && (
                <td className="py-3 pt-3.5 pr-5 pl-3 text-right tabular-nums">
                  <PerKg seen={seen} menu={menu} currency={shelf.pantry.currency} />
                </td>
              )}
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}

/** The formulas one under the other, where a table would be squeezed. */
export function FormulaCards({ formulas, shelf, menu }: Props) {
  return (
    <ul className="divide-y divide-seam">
      {formulas.map((it) => {
        const seen = evaluated(it, shelf);
        return (
          <li key={it.formula.id} className="grid gap-1 px-4 py-3">
            <div className="flex items-start justify-between gap-4">
              <FormulaLink kept={it} />
              {shelf.pantry.can.seeCost && (
                <span className="shrink-0 pt-1.5 tabular-nums">
                  <PerKg seen={seen} menu={menu} currency={shelf.pantry.currency} unit />
                </span>
              )}
            </div>
            <Contains seen={seen} menu={menu} />
            <p className="text-sm text-slate">
              <UsedIn kept={it} shelf={shelf} menu={menu} />
            </p>
          </li>
        );
      })}
    </ul>
  );
}

function evaluated({ formula, current }: KeptFormula, shelf: Shelf): EvaluatedFormula {
  return evaluateFormula(
    { draft: current, formulaId: formula.id, name: formula.name, percentOf: null },
    shelf.index,
  );
}

function FormulaLink({ kept: { formula, current } }: { readonly kept: KeptFormula }) {
  return (
    <span className="flex min-w-0 gap-2.5">
      <span className="pt-1.5">
        <FormulaDab colour={current.baseColour} />
      </span>
      <span className="grid min-w-0">
        <Link to={paths.staffFormula(formula.id)} className="link inline-block w-fit py-1.5">
          {formula.name}
        </Link>
        <span className="-mt-1 text-sm text-slate">
          {kindWords[formula.kind]}, version {current.n}
        </span>
      </span>
    </span>
  );
}

type SeenProps = { readonly seen: EvaluatedFormula; readonly menu: Menu };

function Contains({ seen, menu }: SeenProps) {
  if (seen.contents === null) {
    return (
      <span className="flex items-start gap-1.5 text-sm font-semibold text-berry">
        <ToneGlyph tone="berry" className="mt-0.5 size-4" />
        {seen.problems[0]?.message ?? 'unknown'}
      </span>
    );
  }
  return (
    <AllergenLine
      allergens={seen.contents.allergens}
      region={menu.studio.labelRegion}
      none="No allergen of the list named"
    />
  );
}

function UsedIn({ kept, shelf, menu }: Omit<Props, 'formulas'> & { readonly kept: KeptFormula }) {
  const { id } = kept.formula;
  const names = [
    ...onTheMenu(id, shelf.pantry.parts, menu),
    ...shelf.formulasUsing(id).map((it) => it.name),
  ];
  return names.length === 0 ? 'nothing yet' : names.join('; ');
}

type PerKgProps = SeenProps & { readonly currency: string; readonly unit?: boolean };

function PerKg({ seen, menu, currency, unit = false }: PerKgProps) {
  const price = seen.cost?.perKgOutMinor ?? null;
  if (price === null) {
    return (
      <span className="inline-flex items-center gap-1.5">
        <ToneGlyph tone="butter" className="size-4" />
        unknown
      </span>
    );
  }
  return (
    <>
      {formatMoney(Math.round(price), currency, menu.studio.locale)}
      {unit && <span className="text-slate">/kg</span>}
    </>
  );
}
