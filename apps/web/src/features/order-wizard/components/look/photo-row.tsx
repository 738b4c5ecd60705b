import type { OrderForm } from '../../draft/empty-order.ts';
import { Button } from '#web/components/ui/button.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

type Claim = OrderForm['photos'][number];

type Props = {
  readonly at: number;
  readonly claim: Claim;
  readonly last: boolean;
  readonly onChange: (claim: Claim) => void;
  readonly onMove: (by: 1 | -1) => void;
  readonly onRemove: () => void;
};

/** A picture that has arrived: what it shows of it, its note, its place among the others. */
export function PhotoRow({ at, claim, last, onChange, onMove, onRemove }: Props) {
  const { pictures } = useWizard();
  const picture = pictures[claim.id];
  const problem = useProblemAt(`photos.${at}.note`);
  const name = picture?.name ?? `Picture ${at + 1}`;
  return (
    <li className="grid grid-cols-[5.5rem_1fr] gap-4 border-b border-seam pb-4">
      <PictureThumbnail thumbnail={picture?.thumbnail ?? null} name={name} />
      <div className="grid content-start gap-2">
        <TextField
          name={`photos.${at}.note`}
          label="What do you like about it?"
          optional
          maxLength={300}
          error={problem}
          value={claim.note}
          onChange={(event) => onChange({ ...claim, note: event.target.value })}
        />
        <div className="-ml-2 flex flex-wrap items-center gap-x-1">
          <span className="px-2 text-sm font-semibold text-leaf">Arrived</span>
          {at > 0 && (
            <Button kind="quiet" aria-label={`Move ${name} up`} onClick={() => onMove(-1)}>
              Up
            </Button>
          )}
          {!last && (
            <Button kind="quiet" aria-label={`Move ${name} down`} onClick={() => onMove(1)}>
              Down
            </Button>
          )}
          <Button kind="quiet" aria-label={`Take ${name} out`} onClick={onRemove}>
            Take out
          </Button>
        </div>
      </div>
    </li>
  );
}

/** A picture as this device could read it; a plain frame with its name where it could not. */
export function PictureThumbnail({
  thumbnail,
  name,
}: {
  readonly thumbnail: string | null;
  readonly name: string;
}) {
  return thumbnail === null ? (
    <div className="grid size-22 place-items-center rounded-action bg-cloud p-1 text-center text-xs break-all text-slate">
      {name}
    </div>
  ) : (
    <img
      src={thumbnail}
      alt={name}
      className="size-22 rounded-action border border-seam object-cover"
    />
  );
}
