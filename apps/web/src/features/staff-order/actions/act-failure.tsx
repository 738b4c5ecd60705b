import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { describeFailure } from '#web/lib/describe-failure.ts';
import { hasMovedOn } from '../api/use-order-command.ts';

/** Why an act did not go through; if the order is another one meanwhile, that it was loaded again. */
export function ActFailure({ error }: { readonly error: unknown }) {
  if (error === null) return null;
  if (!hasMovedOn(error)) return <Failure error={error} />;
  const { title, detail } = describeFailure(error);
  return (
    <Notice tone="berry" title={title} live="assertive">
      {detail !== '' && <p>{detail}</p>}
      <p>
        The order has been loaded again as it is now. Look once more, then press again; what you
        wrote is still here.
      </p>
    </Notice>
  );
}
