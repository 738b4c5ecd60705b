import { useQueryClient } from '@tanstack/react-query';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { useKitchenRules } from '#web/features/kitchen-rules/api/get-kitchen-rules.ts';
import { KitchenRulesForm } from '#web/features/kitchen-rules/components/kitchen-rules-form.tsx';
import { menuQuery, useMenu } from '#web/features/menu/api/get-menu.ts';
import { ApiProblem } from '#web/lib/http.ts';

/** `/staff/studio/kitchen`: the figures that amounts, proposals and advice go by. */
export function KitchenRulesPage() {
  const { studio } = useMenu();
  const client = useQueryClient();
  const { data, error, isPending, refetch, isFetching } = useKitchenRules();
  return (
    <div className="page grid gap-8 py-6">
      <PageTitle title="Kitchen" />
      {isPending ? (
        <Pending what="Fetching the figures…" />
      ) : data === undefined ? (
        error instanceof ApiProblem && error.code === 'not-allowed' ? (
          <Notice title="The kitchen’s figures are the owner’s to set">
            <p>What comes of them is on each order’s page.</p>
          </Notice>
        ) : (
          <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
        )
      ) : (
        <KitchenRulesForm
          settings={data}
          studio={studio}
          onSaved={() => void client.invalidateQueries({ queryKey: menuQuery().queryKey })}
        />
      )}
    </div>
  );
}
