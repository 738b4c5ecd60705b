import { useId, useState, useSyncExternalStore } from 'react';
import { useFormContext } from 'react-hook-form';
import { Button } from '#web/components/ui/button.tsx';
import { VisuallyHidden } from '#web/components/ui/visually-hidden.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { acceptedPhotos } from '#web/lib/accepted-photos.ts';
import type { OrderForm } from '../../draft/empty-order.ts';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { PhotoRow } from './photo-row.tsx';
import { PhotoUnderWay } from './photo-under-way.tsx';

/** Pictures to go by, each with a note; they go up while other questions are answered. */
export function PhotoFields() {
  const { menu, values, change, queue } = useWizard();
  const { photos } = values;
  const onTheirWay = useSyncExternalStore(queue.subscribe, queue.snapshot);
  const problem = useProblemAt('photos');
  const [tooMany, setTooMany] = useState(0);
  const toast = useToast();
  // Read when Undo is pressed: other pictures may have arrived by then.
  const { getValues } = useFormContext<OrderForm>();
  const id = useId();
  // What was refused will never arrive, so it takes nobody's place.
  const coming = onTheirWay.filter((it) => it.state !== 'refused').length;
  const room = menu.maxPhotos - photos.length - coming;

  const add = (files: readonly File[]) => {
    queue.add(files.slice(0, Math.max(0, room)).map((file) => ({ file, name: file.name })));
    setTooMany(Math.max(0, files.length - room));
  };

  return (
    <section className="grid gap-4" aria-labelledby="photos-heading">
      <div className="grid gap-1">
        <h2 id="photos-heading">Pictures to go by</h2>
        <p className="measure text-slate">
          Up to {menu.maxPhotos}: a cake you liked, the dress, the invitation. Where a photo was
          taken is removed from it. We do not copy another baker’s cake; we take its mood.
        </p>
      </div>
      {problem !== undefined && <p className="font-semibold text-berry">{problem}</p>}
      <ul className="grid gap-4" aria-label="Pictures that have arrived">
        {photos.map((claim, at) => (
          <PhotoRow
            key={claim.id}
            at={at}
            claim={claim}
            last={at === photos.length - 1}
            onChange={(next) => change({ photos: photos.map((it, i) => (i === at ? next : it)) })}
            onMove={(by) => change({ photos: moved(photos, at, by) })}
            onRemove={() => {
              change({ photos: photos.filter((it) => it.id !== claim.id) });
              toast({
                message: 'Picture taken out.',
                onUndo: () => change({ photos: getValues('photos').toSpliced(at, 0, claim) }),
              });
            }}
          />
        ))}
      </ul>
      {onTheirWay.length > 0 && (
        <ul className="grid gap-4" aria-label="Pictures on their way">
          {onTheirWay.map((photo) => (
            <PhotoUnderWay
              key={photo.key}
              photo={photo}
              onRetry={() => queue.retry(photo.key)}
              onRemove={() => {
                queue.remove(photo.key);
                toast({
                  message: `${photo.name} taken out.`,
                  onUndo: () => queue.add([{ file: photo.file, name: photo.name }]),
                });
              }}
            />
          ))}
        </ul>
      )}
      {room > 0 ? (
        <div>
          <input
            id={id}
            type="file"
            accept={acceptedPhotos}
            multiple
            className="peer sr-only"
            onChange={(event) => {
              add([...(event.target.files ?? [])]);
              // The same file may be chosen again after it was taken out.
              event.target.value = '';
            }}
          />
          <label
            htmlFor={id}
            className="peer-ring inline-flex min-h-11 cursor-pointer items-center rounded-action border-[1.5px] border-cobalt px-5 py-2 font-semibold text-cobalt hover:bg-cobalt-tint"
          >
            {photos.length + onTheirWay.length === 0 ? 'Choose pictures' : 'Choose more'}
          </label>
        </div>
      ) : (
        <p className="text-slate">That is {menu.maxPhotos}. Take one out to choose another.</p>
      )}
      <p role="status">
        {tooMany > 0 &&
          `${menu.maxPhotos} pictures are the most; ${tooMany === 1 ? 'one was' : `${tooMany} were`} left out.`}
      </p>
      {onTheirWay.some((it) => it.state === 'lost') && (
        <div>
          <Button kind="secondary" onClick={() => queue.retry()}>
            Try them again now
          </Button>
        </div>
      )}
      <VisuallyHidden>
        {photos.length > 0 &&
          (photos.length === 1
            ? 'One picture has arrived.'
            : `${photos.length} pictures have arrived.`)}
      </VisuallyHidden>
    </section>
  );
}

function moved<T>(list: readonly T[], at: number, by: 1 | -1): T[] {
  const next = [...list];
  const [taken] = next.splice(at, 1);
  if (taken !== undefined) next.splice(at + by, 0, taken);
  return next;
}
