import { Link } from 'react-router-dom';
import type { Ingredient } from '#shared/contracts/pantry.ts';
import { formatDay } from '#shared/dates/format.ts';
import { labelAllergens } from '#shared/kitchen/label-allergens.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import { paths } from '#web/config/paths.ts';
import { AllergenLine } from '../components/allergen-line.tsx';
import type { House } from '../house.ts';
import { pricePerKgMinor } from './ingredient-gaps.ts';
import { familyWords } from './ingredient-words.ts';

type Props = {
  readonly ingredients: readonly Ingredient[];
  readonly house: House;
  readonly currency: string;
};

/** The shelf: what each product is, when its label was read, what it contains and costs. */
export function IngredientTable({ ingredients, house, currency }: Props) {
  return (
    <table className="w-full border-collapse">
      <caption className="sr-only">Ingredients</caption>
      <thead className="text-left text-sm text-slate">
        <tr>
          <th scope="col" className="py-3 pr-3 pl-5 font-semibold">
            Ingredient
          </th>
          <th scope="col" className="px-3 py-3 font-semibold">
            Family
          </th>
          <th scope="col" className="px-3 py-3 font-semibold">
            Contains
          </th>
          <th scope="col" className="px-3 py-3 font-semibold">
            Label read
          </th>
          <th scope="col" className="py-3 pr-5 pl-3 text-right font-semibold">
            Per kg
          </th>
        </tr>
      </thead>
      <tbody>
        {ingredients.map((it) => (
          <tr key={it.id} className="border-t border-seam align-top hover:bg-cloud">
            <th scope="row" className="py-2 pr-3 pl-5 text-left font-normal">
              <IngredientLink ingredient={it} />
            </th>
            <td className="px-3 pt-3.5 pb-3 text-slate">{familyWords[it.family]}</td>
            <td className="max-w-72 px-3 pt-3.5 pb-3">
              <AllergenLine allergens={labelAllergens(it)} region={house.labelRegion} none="–" />
            </td>
            <td className="px-3 pt-3.5 pb-3 tabular-nums">
              <LabelRead ingredient={it} house={house} />
            </td>
            <td className="py-3 pt-3.5 pr-5 pl-3 text-right tabular-nums">
              <PerKg ingredient={it} house={house} currency={currency} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** The shelf one under the other, where a table would be squeezed. */
export function IngredientCards({ ingredients, house, currency }: Props) {
  return (
    <ul className="divide-y divide-seam">
      {ingredients.map((it) => (
        <li key={it.id} className="grid gap-1 px-4 py-3">
          <div className="flex items-start justify-between gap-4">
            <IngredientLink ingredient={it} />
            <span className="shrink-0 pt-1.5 tabular-nums">
              <PerKg ingredient={it} house={house} currency={currency} unit />
            </span>
          </div>
          <AllergenLine allergens={labelAllergens(it)} region={house.labelRegion} />
          <p className="text-sm text-slate">
            {familyWords[it.family]}, label <LabelRead ingredient={it} house={house} />
          </p>
        </li>
      ))}
    </ul>
  );
}

function IngredientLink({ ingredient }: { readonly ingredient: Ingredient }) {
  return (
    <span className="grid min-w-0">
      <Link to={paths.staffIngredient(ingredient.id)} className="link inline-block w-fit py-1.5">
        {ingredient.name}
      </Link>
      {ingredient.brand !== null && (
        <span className="-mt-1 text-sm text-slate">{ingredient.brand}</span>
      )}
    </span>
  );
}

type CellProps = { readonly ingredient: Ingredient; readonly house: House };

function LabelRead({ ingredient, house }: CellProps) {
  if (ingredient.labelCheckedOn !== null) {
    return (
      <span className="whitespace-nowrap">
        {formatDay(ingredient.labelCheckedOn, {
          locale: house.locale,
          weekday: false,
          year: true,
        })}
      </span>
    );
  }
  return (
    <span className="inline-flex items-center gap-1.5 font-semibold text-berry">
      <ToneGlyph tone="berry" className="size-4" />
      not read yet
    </span>
  );
}

type PriceProps = CellProps & { readonly currency: string; readonly unit?: boolean };

function PerKg({ ingredient, house, currency, unit = false }: PriceProps) {
  const price = pricePerKgMinor(ingredient);
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
      {formatMoney(Math.round(price), currency, house.locale)}
      {unit && <span className="text-slate">/kg</span>}
    </>
  );
}
