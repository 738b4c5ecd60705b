import { useQueryClient } from '@tanstack/react-query';
import { today } from '#shared/dates/local-time.ts';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { useAllergyTable } from '#web/features/allergy-table/api/get-allergy-table.ts';
import { AllergyTableForm } from '#web/features/allergy-table/components/allergy-table-form.tsx';
import { menuQuery, useMenu } from '#web/features/menu/api/get-menu.ts';
import { ApiProblem } from '#web/lib/http.ts';

/** `/staff/studio/allergies`: what the owner takes, talks over and refuses. */
export function AllergiesPage() {
  const { studio } = useMenu();
  const client = useQueryClient();
  const { data, error, isPending, refetch, isFetching } = useAllergyTable();
  return (
    <div className="page grid gap-8 py-6">
      <PageTitle title="Allergies" />
      {isPending ? (
        <Pending what="Fetching the table…" />
      ) : data === undefined ? (
        error instanceof ApiProblem && error.code === 'not-allowed' ? (
          <Notice title="What is taken and refused is the owner’s to say">
            <p>What a guest told, and what it waits for, is on each order’s page.</p>
          </Notice>
        ) : (
          <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
        )
      ) : (
        <AllergyTableForm
          table={data}
          studio={studio}
          today={today(new Date(), studio.zone)}
          onSaved={() => void client.invalidateQueries({ queryKey: menuQuery().queryKey })}
        />
      )}
    </div>
  );
}
