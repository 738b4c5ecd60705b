import { Button } from '#web/components/ui/button.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { instantWords } from '#web/components/order/order-times.ts';
import type { House } from '../house.ts';

type Props = {
  readonly savedAt: number;
  readonly house: House;
  readonly onTake: () => void;
  readonly onDrop: () => void;
};

/** What an earlier tab left on this device and nobody saved. */
export function KeptOffer({ savedAt, house, onTake, onDrop }: Props) {
  const when = instantWords(new Date(savedAt).toISOString(), house.zone, house.locale);
  return (
    <Notice tone="butter" live="polite" title="You had begun to write here and did not save it">
      <p>Kept on this device since {when}.</p>
      <div className="flex flex-wrap gap-2">
        <Button kind="secondary" onClick={onTake}>
          Go on with it
        </Button>
        <Button kind="quiet" onClick={onDrop}>
          Drop it
        </Button>
      </div>
    </Notice>
  );
}
