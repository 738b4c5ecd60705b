import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Failure } from '#web/components/ui/failure.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { cakeCareQuery } from '#web/features/cake-care/api/get-cake-care.ts';
import { CakeSheet } from '#web/features/cake-care/components/cake-sheet.tsx';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { ApiProblem } from '#web/lib/http.ts';

/** `/cake/:code`: what the code on a care card opens. Search engines are asked to keep away. */
export function CakePage() {
  const { code = '' } = useParams();
  const menu = useMenu();
  const { data, error, isPending, isFetching, refetch } = useQuery(cakeCareQuery(code));
  return (
    <div className="page grid gap-8 py-8">
      <meta name="robots" content="noindex" />
      {data !== undefined ? (
        <CakeSheet care={data} menu={menu} />
      ) : isPending ? (
        <>
          <PageTitle title="This cake" />
          <Pending what="Fetching the cake…" />
        </>
      ) : error instanceof ApiProblem && error.code === 'not-found' ? (
        <>
          <PageTitle title="No cake has this code" />
          <p className="measure">
            Look at the code on the care card once more, or ring us: {menu.studio.phone}.
          </p>
        </>
      ) : (
        <>
          <PageTitle title="This cake" />
          <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
        </>
      )}
    </div>
  );
}
