import { useSearchParams } from 'react-router-dom';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { BackLink } from '#web/features/pantry/components/back-link.tsx';
import { PantryGate } from '#web/features/pantry/components/pantry-gate.tsx';
import { FormulaEditor } from '#web/features/pantry/editor/formula-editor.tsx';
import { shelfOf } from '#web/features/pantry/shelf.ts';

/** `/staff/pantry/formulas/new`; `?from=` a version's id begins from a copy of it. */
export function FormulaNewPage() {
  const { studio } = useMenu();
  const [params] = useSearchParams();
  const from = params.get('from') ?? '';
  return (
    <div className="page grid gap-5 py-6">
      <PantryGate title="New formula">
        {(pantry) => {
          const shelf = shelfOf(pantry);
          const copied = shelf.index.versions.get(from) ?? null;
          return (
            <>
              <BackLink to={paths.staffFormulas}>All formulas</BackLink>
              <PageTitle title={copied === null ? 'New formula' : 'New formula from a copy'} />
              <FormulaEditor key={from} kept={null} from={copied} shelf={shelf} house={studio} />
            </>
          );
        }}
      </PantryGate>
    </div>
  );
}
