import { Link } from 'react-router-dom';
import type { Formula, IngredientDraft } from '#shared/contracts/pantry.ts';
import { labelAllergens } from '#shared/kitchen/label-allergens.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { DataList } from '#web/components/ui/data-list.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { paths } from '#web/config/paths.ts';
import { AllergenLine } from '../components/allergen-line.tsx';
import type { House } from '../house.ts';
import { pricePerKgMinor } from './ingredient-gaps.ts';

type Props = {
  /** What is typed, as far as it can be read. */
  readonly draft: IngredientDraft | null;
  readonly usedIn: readonly Formula[];
  readonly house: House;
  readonly currency: string;
};

/** What follows from what is typed: the statement, what it contains, its price, and who uses it. */
export function IngredientAside({ draft, usedIn, house, currency }: Props) {
  return (
    <aside className="grid gap-6 lg:sticky lg:top-6" aria-label="What follows from it">
      {draft !== null && <Follows draft={draft} house={house} currency={currency} />}
      <section className="grid gap-2">
        <h2 className="text-lg">Used in</h2>
        {usedIn.length === 0 ? (
          <p className="text-slate">No formula in use has it.</p>
        ) : (
          <ul className="grid">
            {usedIn.map((it) => (
              <li key={it.id}>
                <Link
                  to={paths.staffFormula(it.id)}
                  className="link inline-flex min-h-9 items-center"
                >
                  {it.name}
                </Link>
              </li>
            ))}
          </ul>
        )}
      </section>
    </aside>
  );
}

type FollowProps = Omit<Props, 'usedIn' | 'draft'> & { readonly draft: IngredientDraft };

function Follows({ draft, house, currency }: FollowProps) {
  const price = pricePerKgMinor(draft);
  const allergens = labelAllergens(draft);
  const unknown = allergens.some((it) => it.state === 'unknown');
  return (
    <>
      {unknown && (
        <Notice tone="berry" title="An unknown allergen stops orders">
          <p>
            Every cake with this in it waits until somebody has read the label and says what it
            says.
          </p>
        </Notice>
      )}
      <DataList
        rows={[
          {
            key: 'statement',
            label: 'In a statement',
            value: draft.labelContents
              ? `${draft.labelName} (${draft.labelContents})`
              : draft.labelName,
          },
          {
            key: 'contains',
            label: 'Contains',
            value: <AllergenLine allergens={allergens} region={house.labelRegion} />,
          },
          {
            key: 'price',
            label: 'Per kilo',
            value:
              price === null ? 'unknown' : formatMoney(Math.round(price), currency, house.locale),
          },
        ]}
      />
    </>
  );
}
