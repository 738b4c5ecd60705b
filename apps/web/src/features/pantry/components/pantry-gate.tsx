import type { ReactNode } from 'react';
import type { Pantry } from '#shared/contracts/pantry.ts';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { ApiProblem } from '#web/lib/http.ts';
import { usePantry } from '../api/get-pantry.ts';

type Props = {
  /** The page's title until it knows its own. */
  readonly title: string;
  readonly children: (pantry: Pantry) => ReactNode;
};

/** What needs the pantry, once it is there; until then why not. */
export function PantryGate({ title, children }: Props) {
  const { data, error, isPending, isFetching, refetch } = usePantry();
  if (data !== undefined) return children(data);
  const closed = error instanceof ApiProblem && error.code === 'not-allowed';
  return (
    <>
      <PageTitle title={title} />
      {isPending ? (
        <Pending what="Fetching the pantry…" />
      ) : closed ? (
        <Notice title="The pantry is the bakers’">
          <p>
            Formulas and what things cost are theirs to see. What is in a cake stands with its
            order.
          </p>
        </Notice>
      ) : (
        <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
      )}
    </>
  );
}
