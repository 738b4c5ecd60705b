import { useId } from 'react';
import { actionClasses } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Progress } from '#web/components/ui/progress.tsx';
import { acceptedPhotos } from '#web/lib/accepted-photos.ts';
import { classNames } from '#web/lib/class-names.ts';
import { useAddOrderPhoto } from '../api/add-order-photo.ts';

/** One more picture for the baker. */
export function AddPhoto({ code }: { readonly code: string }) {
  const id = useId();
  const add = useAddOrderPhoto(code);
  return (
    <div className="grid gap-3">
      {add.isPending && <Progress label={`Sending ${add.variables.name}`} value={add.share} />}
      {add.isError && (
        <Failure
          error={add.error}
          onRetry={() => add.mutate(add.variables)}
          retrying={add.isPending}
        />
      )}
      <div className="relative">
        <input
          id={id}
          type="file"
          accept={acceptedPhotos}
          className="peer sr-only"
          onChange={(event) => {
            const file = event.target.files?.[0];
            // The same file may be chosen again after it was refused.
            event.target.value = '';
            if (file && !add.isPending) add.mutate(file);
          }}
        />
        <label
          htmlFor={id}
          className={classNames(
            actionClasses('secondary', 'normal', false),
            'cursor-pointer peer-focus-visible:outline-3 peer-focus-visible:outline-offset-2 peer-focus-visible:outline-cobalt',
          )}
        >
          Add a photo
        </label>
      </div>
    </div>
  );
}
