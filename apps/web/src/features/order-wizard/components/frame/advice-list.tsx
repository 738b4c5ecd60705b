import { Link } from 'react-router-dom';
import type { Advice } from '#shared/contracts/estimates.ts';
import { AdviceNote, byGravity } from '#web/components/order/advice-note.tsx';
import { Button } from '#web/components/ui/button.tsx';
import { paths, type OrderStep } from '#web/config/paths.ts';
import { applyPatch } from '../../design/edit-cake.ts';
import { steps } from '../../steps/steps.ts';
import { fromCheck } from '../../steps/use-step.ts';
import { useWizard } from '../../wizard/wizard-context.ts';
import { Aloud } from './estimate-lines.tsx';

type Props = {
  /** The page this is on; no link leads to where one is. */
  readonly step: OrderStep;
  readonly advice: readonly Advice[];
  readonly keepCool: string;
  /** Called when a link leads away from here, to close a drawer. */
  readonly onLeave?: (() => void) | undefined;
};

/** What to look after, the gravest first, each with what to do instead. */
export function AdviceList({ step, advice, keepCool, onLeave }: Props) {
  const sorted = byGravity(advice);
  const grave = sorted.filter((it) => it.level !== 'ok');
  return (
    <div className="grid gap-3">
      {sorted.length > 0 && (
        <ul className="grid gap-3">
          {sorted.map((it) => (
            <AdviceItem key={`${it.code} ${it.about}`} step={step} advice={it} onLeave={onLeave} />
          ))}
        </ul>
      )}
      {keepCool !== '' && <p className="text-sm text-slate">{keepCool}</p>}
      <Aloud text={grave.map((it) => it.sentence).join(' ')} />
    </div>
  );
}

type ItemProps = {
  readonly step: OrderStep;
  readonly advice: Advice;
  readonly onLeave?: (() => void) | undefined;
};

/** One piece of advice; its ways out are applied in one press, with Undo. */
export function AdviceItem({ step, advice, onLeave }: ItemProps) {
  const { values, change } = useWizard();
  return (
    <li className="grid">
      <AdviceNote advice={advice} small />
      {advice.level !== 'ok' && (
        <div className="ml-5.5 flex flex-wrap gap-x-2 text-sm">
          {advice.ways.map((way) => (
            <WayOut
              key={way.label}
              way={way}
              onTake={() => {
                const { cake, look, setting } = applyPatch(values, way.patch);
                change({ cake, look, setting }, `Changed: ${way.label}.`);
              }}
            />
          ))}
          {advice.step !== step && (
            <Link
              to={paths.orderStep(advice.step)}
              state={step === 'check' ? fromCheck : null}
              onClick={onLeave}
              className="link inline-flex min-h-11 items-center px-2"
            >
              To {steps[advice.step].name.toLowerCase()}
            </Link>
          )}
        </div>
      )}
    </li>
  );
}

type WayProps = { readonly way: Advice['ways'][number]; readonly onTake: () => void };

/** A way out as one press, and under it what it changes where its name does not say all. */
function WayOut({ way, onTake }: WayProps) {
  const more = way.changes.length > 1;
  return (
    <div className={more ? 'grid w-full justify-items-start' : undefined}>
      <Button kind="quiet" className="text-left text-sm" onClick={onTake}>
        {way.label}
      </Button>
      {more && <p className="-mt-1.5 px-2 pb-1 text-slate">{way.changes.join(' ')}</p>}
    </div>
  );
}
