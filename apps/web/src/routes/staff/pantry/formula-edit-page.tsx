import { useParams, useSearchParams } from 'react-router-dom';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { BackLink } from '#web/features/pantry/components/back-link.tsx';
import { NotInPantry } from '#web/features/pantry/components/not-in-pantry.tsx';
import { PantryGate } from '#web/features/pantry/components/pantry-gate.tsx';
import { FormulaEditor } from '#web/features/pantry/editor/formula-editor.tsx';
import { shelfOf } from '#web/features/pantry/shelf.ts';

/** `/staff/pantry/formulas/:id/edit`: its next version; `?from=2` begins from an earlier one. */
export function FormulaEditPage() {
  const { id = '' } = useParams();
  const { studio } = useMenu();
  const [params] = useSearchParams();
  return (
    <div className="page grid gap-5 py-6">
      <PantryGate title="Formula, next version">
        {(pantry) => {
          const shelf = shelfOf(pantry);
          const kept = shelf.formulas.get(id);
          if (kept === undefined) return <NotInPantry what="formula" back={paths.staffFormulas} />;
          if (kept.formula.archivedAt !== null) {
            return (
              <>
                <BackLink to={paths.staffFormula(id)}>{kept.formula.name}</BackLink>
                <PageTitle title={kept.formula.name} />
                <Notice title="Archived: take it back into use to change it" />
              </>
            );
          }
          const from = kept.versions.find((it) => it.n === Number(params.get('from')));
          return (
            <>
              <BackLink to={paths.staffFormula(id)}>{kept.formula.name} as it is</BackLink>
              <PageTitle title={`${kept.formula.name}, next version`} />
              {from !== undefined && (
                <Notice title={`Begun from version ${from.n}`}>
                  <p>
                    What is different from version {kept.current.n} stands under “What changed”.
                  </p>
                </Notice>
              )}
              <FormulaEditor
                key={id}
                kept={kept}
                from={from ?? kept.current}
                shelf={shelf}
                house={studio}
              />
            </>
          );
        }}
      </PantryGate>
    </div>
  );
}
