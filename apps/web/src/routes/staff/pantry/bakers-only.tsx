import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { ApiProblem } from '#web/lib/http.ts';

/** Whether the server said that this is not for whoever asked. */
export function isRefused(error: unknown): boolean {
  return error instanceof ApiProblem && error.code === 'not-allowed';
}

/** In the place of a page that is for those who bake. */
export function BakersOnly({ title }: { readonly title: string }) {
  return (
    <div className="page grid gap-5 py-6">
      <PageTitle title={title} />
      <Notice title="This is the bakers’">
        <p>What is in a cake, and when it is collected, stands with its order.</p>
      </Notice>
    </div>
  );
}
