import { useCallback } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { type Pantry, formulaKinds } from '#shared/contracts/pantry.ts';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { EmptyState } from '#web/components/ui/empty-state.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { FindField } from '#web/components/ui/find-field.tsx';
import { PantryGate } from '#web/features/pantry/components/pantry-gate.tsx';
import { TitleRow } from '#web/features/pantry/components/title-row.tsx';
import { FormulaCards, FormulaTable } from '#web/features/pantry/formulas/formula-list.tsx';
import {
  type FormulaSearch,
  findFormulas,
  readFormulaSearch,
  writeFormulaSearch,
} from '#web/features/pantry/formulas/formula-search.ts';
import { kindWords } from '#web/features/pantry/formulas/formula-words.ts';
import { shelfOf } from '#web/features/pantry/shelf.ts';
import { roomForTable, useMedia } from '#web/lib/use-media.ts';

/** `/staff/pantry/formulas`: what everything is made by. */
export function FormulasPage() {
  return (
    <div className="page grid gap-5 py-6">
      <PantryGate title="Formulas">{(pantry) => <Formulas pantry={pantry} />}</PantryGate>
    </div>
  );
}

function Formulas({ pantry }: { readonly pantry: Pantry }) {
  const menu = useMenu();
  const [params] = useSearchParams();
  const navigate = useNavigate();
  const search = readFormulaSearch(params);
  const shelf = shelfOf(pantry);
  const found = findFormulas(shelf, search);
  const table = useMedia(roomForTable);
  const onSearch = useCallback(
    (next: FormulaSearch) => void navigate(`?${writeFormulaSearch(next)}`, { replace: true }),
    [navigate],
  );
  const List = table ? FormulaTable : FormulaCards;
  const empty = pantry.formulas.length === 0;
  return (
    <>
      <TitleRow title={<PageTitle title="Formulas" />}>
        {pantry.can.save && (
          <LinkButton to={paths.staffFormulaNew} kind="secondary">
            New formula
          </LinkButton>
        )}
      </TitleRow>
      <form
        role="search"
        className="flex flex-wrap items-end gap-x-5 gap-y-3"
        onSubmit={(event) => event.preventDefault()}
      >
        <FindField
          hint="A name, or something that is in it."
          find={search.find}
          onFind={(find) => onSearch({ ...search, find })}
        />
        <ChipChoice
          legend={<span className="sr-only">Kind</span>}
          value={search.kind ?? 'all'}
          onValue={(kind) => onSearch({ ...search, kind: kind === 'all' ? null : kind })}
          chips={[
            { value: 'all', label: 'All' },
            ...formulaKinds.map((value) => ({ value, label: kindWords[value] })),
          ]}
        />
        <Checkbox
          label="Archived"
          checked={search.archived}
          onChange={(event) => onSearch({ ...search, archived: event.target.checked })}
        />
      </form>
      {found.length === 0 ? (
        <EmptyState
          title={empty ? 'There are no formulas yet' : 'No formula is like that'}
          action={
            empty ? (
              <LinkButton to={paths.staffFormulaNew}>Write the first one</LinkButton>
            ) : (
              <LinkButton to={paths.staffFormulas} kind="secondary">
                Show all formulas
              </LinkButton>
            )
          }
        >
          {empty
            ? 'Amounts, eggs, allergens and cost are all worked out from formulas.'
            : 'Take something away from what narrows the list.'}
        </EmptyState>
      ) : (
        <Rim label="Formulas" className="overflow-hidden">
          <List formulas={found} shelf={shelf} menu={menu} />
        </Rim>
      )}
    </>
  );
}
