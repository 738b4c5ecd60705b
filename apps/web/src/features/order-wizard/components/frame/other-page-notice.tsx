import { useSyncExternalStore } from 'react';
import { Button } from '#web/components/ui/button.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { useWizard } from '../../wizard/wizard-context.ts';
import { clockTime } from './draft-line.tsx';

/** The order is open in two tabs and the other is ahead: the customer says which one counts. */
export function OtherPageNotice() {
  const { keeper, takeOther } = useWizard();
  const { other } = useSyncExternalStore(keeper.subscribe, keeper.status);
  if (other === null) return null;
  const gone = other === 'cleared';
  return (
    <div className="page pt-4">
      <Notice
        tone="butter"
        live="polite"
        title={
          gone
            ? 'This order was sent, or begun anew, in another tab'
            : `This order was changed in another tab at ${clockTime(other.savedAt)}`
        }
      >
        <p>
          {gone
            ? 'To keep what stands here as a new draft, say so; nothing is kept until you do.'
            : 'Choose which one counts. Nothing is kept here until you do.'}
        </p>
        <div className="flex flex-wrap gap-3">
          <Button kind="secondary" onClick={takeOther}>
            {gone ? 'Begin anew here too' : 'Take the newer one'}
          </Button>
          <Button kind="quiet" onClick={() => keeper.keepMine()}>
            Keep what is here
          </Button>
        </div>
      </Notice>
    </div>
  );
}
