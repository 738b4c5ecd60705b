import { useId, useState } from 'react';
import type { Photo } from '#shared/contracts/photos.ts';
import { FieldError } from '#web/components/ui/field-frame.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { Progress } from '#web/components/ui/progress.tsx';
import { acceptedPhotos } from '#web/lib/accepted-photos.ts';
import { describeFailure } from '#web/lib/describe-failure.ts';
import { photoAddress, photoAlt } from '#web/components/photos/photo-address.ts';
import { useAddOrderPhoto } from '../api/add-order-photo.ts';

type Props = {
  readonly number: number;
  readonly kind: Photo['kind'];
  readonly label: string;
  readonly hint: string;
  readonly note?: string;
  /** What was taken; null before. */
  readonly photo: Photo | null;
  readonly onPhoto: (photo: Photo) => void;
};

/** Takes one photo and sends it at once, with progress; a failed one can be sent again. */
export function PhotoChoice({ number, kind, label, hint, note = '', photo, onPhoto }: Props) {
  const id = useId();
  const add = useAddOrderPhoto(number);
  const [progress, setProgress] = useState(0);
  const send = (file: File) => {
    setProgress(0);
    add.mutate({ file, kind, note, onProgress: setProgress }, { onSuccess: onPhoto });
  };
  const failed = add.isError ? describeFailure(add.error) : null;
  return (
    <div className="grid justify-items-start gap-2">
      <label htmlFor={id} className="font-semibold">
        {label}
        <span className="font-normal text-slate"> (if you like)</span>
      </label>
      <p id={`${id}-hint`} className="text-sm text-slate">
        {hint}
      </p>
      <input
        id={id}
        type="file"
        accept={acceptedPhotos}
        aria-describedby={`${id}-hint ${id}-error`}
        className="min-h-11 max-w-full text-sm file:mr-3 file:min-h-11 file:cursor-pointer file:rounded-action file:border-[1.5px] file:border-solid file:border-cobalt file:bg-enamel file:px-4 file:font-semibold file:text-cobalt"
        onChange={(event) => {
          const [file] = event.target.files ?? [];
          if (file) send(file);
        }}
      />
      {add.isPending && (
        <div className="w-full max-w-xs">
          <Progress label="Sending the photo" value={progress} />
        </div>
      )}
      <FieldError
        id={`${id}-error`}
        message={failed === null ? undefined : `${failed.title}. ${failed.detail}`}
      />
      {add.isError && (
        <Button kind="secondary" onClick={() => add.variables && send(add.variables.file)}>
          Send it again
        </Button>
      )}
      {photo !== null && (
        <img
          src={photoAddress(photo, 400)}
          alt={photoAlt(photo)}
          width={photo.width}
          height={photo.height}
          className="h-auto w-40 rounded-action border border-seam"
        />
      )}
    </div>
  );
}
