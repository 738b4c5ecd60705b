import { useMemo } from 'react';
import { useLocation, useParams, useSearchParams } from 'react-router-dom';
import * as z from 'zod/mini';
import type { Pantry } from '#shared/contracts/pantry.ts';
import { evaluateFormula } from '#shared/kitchen/formulas/evaluate-formula.ts';
import { Button } from '#web/components/ui/button.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { useArchiveFormula } from '#web/features/pantry/api/archive-formula.ts';
import { ArchiveButton, ArchiveFailure } from '#web/features/pantry/components/archive-button.tsx';
import { BackLink } from '#web/features/pantry/components/back-link.tsx';
import { NotInPantry } from '#web/features/pantry/components/not-in-pantry.tsx';
import { PantryGate } from '#web/features/pantry/components/pantry-gate.tsx';
import { TouchedOrders } from '#web/features/pantry/components/touched-orders.tsx';
import { TitleRow } from '#web/features/pantry/components/title-row.tsx';
import { FormulaBench } from '#web/features/pantry/formulas/formula-bench.tsx';
import { FormulaDab } from '#web/features/pantry/formulas/formula-dab.tsx';
import { FormulaFacts, PrintedFacts } from '#web/features/pantry/formulas/formula-facts.tsx';
import { kindWords, versionDate } from '#web/features/pantry/formulas/formula-words.ts';
import { VersionHistory } from '#web/features/pantry/formulas/version-history.tsx';
import { type KeptFormula, shelfOf } from '#web/features/pantry/shelf.ts';

/** `/staff/pantry/formulas/:id`, an earlier one with `?version=2`. */
export function FormulaPage() {
  const { id = '' } = useParams();
  return (
    <div className="page grid gap-5 py-6">
      <PantryGate title="Formula">{(pantry) => <Find id={id} pantry={pantry} />}</PantryGate>
    </div>
  );
}

/** What saving it just now did to orders, told once by the editor. */
const justSaved = z.object({ touched: z.array(z.int()) });

type FindProps = { readonly id: string; readonly pantry: Pantry };

function Find({ id, pantry }: FindProps) {
  const kept = shelfOf(pantry).formulas.get(id);
  return kept === undefined ? (
    <NotInPantry what="formula" back={paths.staffFormulas} />
  ) : (
    <OneFormula key={id} kept={kept} pantry={pantry} />
  );
}

type Props = { readonly kept: KeptFormula; readonly pantry: Pantry };

function OneFormula({ kept, pantry }: Props) {
  const menu = useMenu();
  const archive = useArchiveFormula();
  const [params] = useSearchParams();
  const shelf = shelfOf(pantry);
  const { formula, current, versions } = kept;
  const saved = justSaved.safeParse(useLocation().state);
  const asked = Number(params.get('version'));
  const version = versions.find((it) => it.n === asked) ?? current;
  const old = version.id !== current.id;
  const seen = useMemo(
    () =>
      evaluateFormula(
        { draft: version, formulaId: formula.id, name: formula.name, percentOf: null },
        shelf.index,
      ),
    [version, formula, shelf],
  );
  const archived = formula.archivedAt !== null;
  const { name } = menu.studio;
  return (
    <>
      <BackLink to={paths.staffFormulas}>All formulas</BackLink>
      <TitleRow
        title={
          <div className="grid gap-1">
            <div className="flex items-center gap-3">
              <FormulaDab colour={version.baseColour} />
              <PageTitle title={formula.name} />
            </div>
            <p className="text-slate">
              {kindWords[formula.kind]}, version {version.n} of{' '}
              {versionDate(version.createdAt, menu.studio)}
              {version.createdBy !== '' && `, by ${version.createdBy}`}
              <span className="hidden print:inline">, {name}</span>
            </p>
          </div>
        }
      >
        {pantry.can.save && !old && !archived && (
          <LinkButton to={paths.staffFormulaEdit(formula.id)}>Change it</LinkButton>
        )}
        {pantry.can.save && (
          <LinkButton to={paths.staffFormulaCopy(version.id)} kind="secondary">
            Begin from a copy
          </LinkButton>
        )}
        <Button kind="secondary" onClick={() => window.print()}>
          Print for the bench
        </Button>
        {pantry.can.save && (
          <ArchiveButton
            archived={archived}
            pending={archive.isPending}
            onArchive={(next) => archive.mutate({ id: formula.id, archived: next })}
          />
        )}
      </TitleRow>
      {saved.success && saved.data.touched.length > 0 && (
        <TouchedOrders numbers={saved.data.touched} />
      )}
      {archive.error !== null && <ArchiveFailure error={archive.error} />}
      {archived && (
        <Notice title="Archived: nothing new is made by it">
          <p>Orders made with it keep the version they were made with.</p>
        </Notice>
      )}
      {old && (
        <Notice tone="butter" title={`Version ${version.n} is an earlier one`}>
          <p>
            Version {current.n} is in use now. Orders that keep version {version.n} are still made
            by it.
          </p>
          <div>
            <LinkButton to={paths.staffFormula(formula.id)} kind="secondary">
              To version {current.n}
            </LinkButton>
          </div>
        </Notice>
      )}
      <div className="grid items-start gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_24rem] print:block">
        <div className="grid min-w-0 gap-4">
          <PrintedFacts version={version} seen={seen} menu={menu} />
          <FormulaBench
            key={`bench ${version.id} ${params.get('make') ?? ''}`}
            formula={formula}
            version={version}
            shelf={shelf}
            menu={menu}
            makeG={params.get('make')}
          />
        </div>
        <div className="lg:col-start-2 lg:row-span-2 lg:row-start-1 print:hidden">
          <FormulaFacts formula={formula} version={version} seen={seen} shelf={shelf} menu={menu} />
        </div>
        <VersionHistory
          key={`versions ${current.id}`}
          kept={kept}
          shown={version}
          shelf={shelf}
          house={menu.studio}
        />
      </div>
    </>
  );
}
