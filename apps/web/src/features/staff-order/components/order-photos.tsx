import { useState } from 'react';
import type { Photo } from '#shared/contracts/photos.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { photoKindWords } from '#web/components/photos/photo-address.ts';
import { PhotoGrid } from '#web/components/photos/photo-grid.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { Unfold } from '#web/components/ui/unfold.tsx';
import { PhotoChoice } from './photo-choice.tsx';

const ours = ['finished', 'handover', 'fault'] as const;
type Ours = (typeof ours)[number];

/** What the customer sent and what the studio took. */
export function OrderPhotos({ order }: { readonly order: StaffOrder }) {
  // The one taken at the handover stands with its record.
  const photos = order.photos.filter((it) => it.id !== order.handover?.photo?.id);
  return (
    <div className="grid gap-5">
      {photos.length === 0 ? (
        <p className="text-slate">There are none.</p>
      ) : (
        <PhotoGrid photos={photos} />
      )}
      {order.can.addPhotos && (
        <Unfold label="Add a photo">
          {(fold) => <AddPhoto number={order.number} onDone={fold} />}
        </Unfold>
      )}
    </div>
  );
}

function AddPhoto({ number, onDone }: { readonly number: number; readonly onDone: () => void }) {
  const [kind, setKind] = useState<Ours>('finished');
  const [note, setNote] = useState('');
  const [added, setAdded] = useState<Photo | null>(null);
  const toast = useToast();
  return (
    <div className="grid gap-4 rounded-action bg-cloud p-4">
      <ChipChoice
        legend="What it shows"
        value={kind}
        onValue={setKind}
        chips={ours.map((value) => ({ value, label: photoKindWords(value) }))}
      />
      <TextField
        label="A note to it"
        optional
        maxLength={300}
        value={note}
        onChange={(event) => setNote(event.target.value)}
      />
      <PhotoChoice
        number={number}
        kind={kind}
        note={note}
        label="The photo"
        hint="JPEG, PNG, WebP, AVIF or GIF, at most 25 MB. It is sent as soon as you choose it."
        photo={added}
        onPhoto={(photo) => {
          setAdded(photo);
          toast({ message: 'The photo is with the order.' });
          onDone();
        }}
      />
      <div>
        <Button kind="quiet" onClick={onDone}>
          Close
        </Button>
      </div>
    </div>
  );
}
