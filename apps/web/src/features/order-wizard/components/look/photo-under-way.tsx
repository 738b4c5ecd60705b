import { Button } from '#web/components/ui/button.tsx';
import { Progress } from '#web/components/ui/progress.tsx';
import type { QueuedPhoto } from '../../photos/photo-queue.ts';

type Props = {
  readonly photo: QueuedPhoto;
  readonly onRetry: () => void;
  readonly onRemove: () => void;
};

/** A picture on its way: how far it has come, or why it has not. */
export function PhotoUnderWay({ photo, onRetry, onRemove }: Props) {
  const { name, state, share, message } = photo;
  return (
    <li className="grid gap-1 border-b border-seam pb-3">
      {state === 'sending' && (
        <Progress
          label={share < 1 ? name : `${name}: preparing it`}
          value={share < 1 ? share : null}
        />
      )}
      {state === 'waiting' && <p className="text-slate">{name} is next.</p>}
      {state === 'lost' && (
        <p role="status">
          <strong>{name}</strong> is waiting for the connection; it goes on by itself.
        </p>
      )}
      {state === 'refused' && (
        <p role="alert" className="font-semibold text-berry">
          {name}: {message}
        </p>
      )}
      <div className="-ml-2 flex flex-wrap gap-x-1">
        {state === 'lost' && (
          <Button kind="quiet" aria-label={`Try ${name} again`} onClick={onRetry}>
            Try again
          </Button>
        )}
        <Button kind="quiet" aria-label={`Take ${name} out`} onClick={onRemove}>
          Take out
        </Button>
      </div>
    </li>
  );
}
