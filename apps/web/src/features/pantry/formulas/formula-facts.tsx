import { Link } from 'react-router-dom';
import type { Menu } from '#shared/contracts/menu.ts';
import type { Formula, FormulaVersion } from '#shared/contracts/pantry.ts';
import { formatList } from '#shared/dates/format.ts';
import type { EvaluatedFormula } from '#shared/kitchen/formulas/evaluate-formula.ts';
import { allergenLabel } from '#shared/kitchen/allergen-names.ts';
import { formatBenchTemperature, mlPerUsCup } from '#shared/kitchen/measures.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { DataList, type DataRow } from '#web/components/ui/data-list.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { paths } from '#web/config/paths.ts';
import { AllergenLine } from '../components/allergen-line.tsx';
import type { Shelf } from '../shelf.ts';
import { gramsText } from '#web/lib/grams-text.ts';
import { onTheMenu, percentText, shelfLife } from './formula-words.ts';

type Props = {
  readonly formula: Formula;
  readonly version: FormulaVersion;
  readonly seen: EvaluatedFormula;
  readonly shelf: Shelf;
  readonly menu: Menu;
};

/** What follows from a formula and what is kept of it, beside what is weighed. */
export function FormulaFacts({ formula, version, seen, shelf, menu }: Props) {
  return (
    <aside aria-label="About it" className="grid content-start gap-5">
      <Cautions seen={seen} shelf={shelf} />
      <DataList rows={factRows({ formula, version, seen, shelf, menu })} />
      {version.note !== '' && (
        <p className="measure whitespace-pre-line text-slate">{version.note}</p>
      )}
      <UsedIn formula={formula} shelf={shelf} menu={menu} />
    </aside>
  );
}

/** What stops orders or wants care, in its own words. */
export function Cautions({ seen, shelf }: Pick<Props, 'seen' | 'shelf'>) {
  const unknown = seen.contents?.allergens.some((it) => it.state === 'unknown') === true;
  const unpriced = shelf.pantry.can.seeCost ? (seen.cost?.unpriced ?? []) : [];
  return (
    <>
      {unknown && (
        <Notice tone="berry" title="An unknown allergen stops orders">
          <p>
            A label of something in it has not been read, or leaves it open.{' '}
            <Link to={`${paths.staffIngredients}?first=unknown`} className="link">
              See which
            </Link>
          </p>
        </Notice>
      )}
      {seen.contents?.undercookedEgg === true && (
        <Notice tone="butter" title="Egg neither pasteurized nor cooked to its limit">
          <p className="text-sm">
            Use pasteurized egg, or bring the mix itself to its limit on a probe and log it; else
            the advisory goes with the cake. Local code decides.
          </p>
        </Notice>
      )}
      {unpriced.length > 0 && (
        <Notice tone="butter" title="The cost is not whole">
          <p className="text-sm">
            No price is known of {formatList(unpriced.map((it) => it.name))}.
          </p>
        </Notice>
      )}
    </>
  );
}

/** On the bench's paper: what it contains and how long it keeps, nothing that others need not read. */
export function PrintedFacts({ version, seen, menu }: Pick<Props, 'version' | 'seen' | 'menu'>) {
  const { labelRegion } = menu.studio;
  const told = (seen.contents?.allergens ?? []).filter((it) => it.state !== 'not-declared');
  const keeps = [
    version.keepsRoomHours === null ? '' : `at room ${shelfLife(version.keepsRoomHours)}`,
    version.keepsChilledHours === null ? '' : `chilled ${shelfLife(version.keepsChilledHours)}`,
    version.keepsFrozenHours === null ? '' : `frozen ${shelfLife(version.keepsFrozenHours)}`,
  ].filter((it) => it !== '');
  return (
    <div className="hidden gap-1 print:grid">
      <p>
        <strong>
          {seen.contents === null
            ? 'What it contains is unknown.'
            : told.length === 0
              ? 'No allergen of the list is named.'
              : (['contains', 'may-contain', 'unknown'] as const)
                  .map((state) => [state, told.filter((it) => it.state === state)] as const)
                  .filter(([, entries]) => entries.length > 0)
                  .map(
                    ([state, entries]) =>
                      `${statement[state]} ${formatList(entries.map((it) => allergenLabel(it, labelRegion)))}.`,
                  )
                  .join(' ')}
        </strong>
      </p>
      {keeps.length > 0 && <p>Keeps {keeps.join(', ')}.</p>}
    </div>
  );
}

const statement = {
  contains: 'Contains',
  'may-contain': 'May contain',
  unknown: 'Unknown:',
} as const;

function factRows({ version, seen, shelf, menu }: Props): DataRow[] {
  const { studio } = menu;
  const { seeCost } = shelf.pantry.can;
  const perKg = seen.cost?.perKgOutMinor ?? null;
  const money = (minor: number) =>
    formatMoney(Math.round(minor), shelf.pantry.currency, studio.locale);
  const keeps: DataRow[] = [
    ['keepsRoomHours', 'Keeps at room'] as const,
    ['keepsChilledHours', 'Keeps chilled'] as const,
    ['keepsFrozenHours', 'Keeps frozen'] as const,
  ].map(([key, label]) => {
    const hours = version[key];
    return { key, label, value: hours === null ? 'not said' : shelfLife(hours) };
  });
  return [
    {
      key: 'contains',
      label: 'Contains',
      value:
        seen.contents === null ? (
          'unknown'
        ) : (
          <AllergenLine
            allergens={seen.contents.allergens}
            region={studio.labelRegion}
            none="No allergen of the list named"
          />
        ),
    },
    ...(seen.contents === null
      ? []
      : [{ key: 'statement', label: 'Statement', value: seen.contents.statement }]),
    ...(seeCost
      ? [{ key: 'cost', label: 'Costs per kilo', value: perKg === null ? 'unknown' : money(perKg) }]
      : []),
    {
      key: 'yield',
      label: 'Comes out',
      value: `${percentText(version.yieldPpm / 10_000, studio.locale)} of what goes in`,
    },
    ...(version.bakeLossPpm > 0
      ? [
          {
            key: 'bake',
            label: 'Baking takes',
            value: percentText(version.bakeLossPpm / 10_000, studio.locale),
          },
        ]
      : []),
    {
      key: 'density',
      label: 'Density',
      value: `${version.densityGPerMl} g/mL; a level cup weighs ${gramsText(version.densityGPerMl * mlPerUsCup, studio.locale)}`,
    },
    ...keeps,
    ...(version.holdsToC === null
      ? []
      : [
          {
            key: 'holds',
            label: 'Holds its shape to',
            value: formatBenchTemperature(version.holdsToC, studio.temperatureLead),
          },
        ]),
    {
      key: 'cold',
      label: 'Cold holding',
      value: version.refrigerate
        ? `yes, at ${formatBenchTemperature(5, studio.temperatureLead)} or below`
        : 'not needed, by the owner’s word',
    },
  ];
}

function UsedIn({ formula, shelf, menu }: Pick<Props, 'formula' | 'shelf' | 'menu'>) {
  const sold = onTheMenu(formula.id, shelf.pantry.parts, menu);
  const inside = shelf.formulasUsing(formula.id);
  return (
    <section className="grid gap-1">
      <h2 className="text-lg">Used in</h2>
      {sold.length + inside.length === 0 && <p className="text-slate">Nothing yet.</p>}
      <ul className="grid">
        {sold.map((it) => (
          <li key={it} className="py-1">
            {it}
          </li>
        ))}
        {inside.map((it) => (
          <li key={it.id}>
            <Link to={paths.staffFormula(it.id)} className="link inline-flex min-h-9 items-center">
              {it.name}
            </Link>
          </li>
        ))}
      </ul>
    </section>
  );
}
