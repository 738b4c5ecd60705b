import { describeFailure } from '#web/lib/describe-failure.ts';
import { Button } from './button.tsx';
import { Notice } from './notice.tsx';

/** A request that failed: what is wrong and a way to try again. */
export function Failure({
  error,
  onRetry,
  retrying = false,
}: {
  readonly error: unknown;
  readonly onRetry?: () => void;
  readonly retrying?: boolean;
}) {
  const { title, detail } = describeFailure(error);
  return (
    <Notice tone="berry" title={title} live="assertive">
      {detail !== '' && <p>{detail}</p>}
      {onRetry && (
        <div>
          <Button kind="secondary" pending={retrying} onClick={onRetry}>
            Try again
          </Button>
        </div>
      )}
    </Notice>
  );
}
