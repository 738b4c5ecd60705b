import { LinkButton } from '#web/components/ui/link-button.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { paths } from '#web/config/paths.ts';

/** An address that leads nowhere. */
export function NotFoundPage() {
  return (
    <div className="page grid justify-items-start gap-5 py-12">
      <PageTitle title="There is nothing here" />
      <p className="measure">
        The address may be old or mistyped. If it came in an e-mail of ours, open that e-mail again
        and press its button.
      </p>
      <div className="flex flex-wrap gap-3">
        <LinkButton to={paths.home}>To the first page</LinkButton>
        <LinkButton to={paths.order} kind="secondary">
          Order a cake
        </LinkButton>
      </div>
    </div>
  );
}
