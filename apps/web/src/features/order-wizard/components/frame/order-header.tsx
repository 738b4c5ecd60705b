import { Link } from 'react-router-dom';
import { HeaderSlot } from '#web/components/ui/site-header.tsx';
import { paths, type OrderStep } from '#web/config/paths.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { DraftLine } from './draft-line.tsx';
import { StepsDrawer } from './steps-drawer.tsx';

type Props = { readonly step: OrderStep; readonly signedInAs: string | null };

/** The order's own words at the top: the draft, starting over, and signing in. */
export function OrderHeader({ step, signedInAs }: Props) {
  const { startOver } = useWizard();
  const signInTo = signedInAs === null ? paths.signInThen(paths.orderStep(step)) : null;
  return (
    <HeaderSlot>
      <div className="md:hidden">
        <StepsDrawer step={step} signInTo={signInTo} />
      </div>
      <div className="hidden flex-wrap items-center gap-x-5 text-sm text-slate md:flex">
        <DraftLine />
        <button type="button" className="link min-h-11" onClick={startOver}>
          Start over
        </button>
        {signInTo === null ? (
          <Link to={paths.account} className="link inline-flex min-h-11 items-center">
            {signedInAs}
          </Link>
        ) : (
          <Link to={signInTo} className="link inline-flex min-h-11 items-center">
            Sign in
          </Link>
        )}
      </div>
    </HeaderSlot>
  );
}
