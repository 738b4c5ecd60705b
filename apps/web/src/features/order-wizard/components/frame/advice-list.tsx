import { Link } from 'react-router-dom';
import type { Advice } from '#shared/contracts/estimates.ts';
import { Button } from '#web/components/ui/button.tsx';
import { ToneGlyph, type Tone } from '#web/components/ui/notice.tsx';
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

const tones: Readonly<Record<Advice['level'], Tone>> = {
  ok: 'leaf',
  care: 'butter',
  stop: 'berry',
};
const rank: Readonly<Record<Advice['level'], number>> = { stop: 0, care: 1, ok: 2 };

/** What to look after, the gravest first, each with what to do instead. */
export function AdviceList({ step, advice, keepCool, onLeave }: Props) {
  const sorted = advice.toSorted((a, b) => rank[a.level] - rank[b.level]);
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
    <li className="flex gap-2.5 text-sm">
      <ToneGlyph tone={tones[advice.level]} className="mt-0.5" />
      <div className="grid min-w-0 gap-1">
        <p className="font-semibold">{advice.sentence}</p>
        {advice.instead !== '' && <p className="text-slate">{advice.instead}</p>}
        {advice.level !== 'ok' && (
          <div className="-ml-2 flex flex-wrap gap-x-2">
            {advice.ways.map((way) => (
              <Button
                key={way.label}
                kind="quiet"
                className="text-sm"
                onClick={() => {
                  const { cake, look, setting } = applyPatch(values, way.patch);
                  change({ cake, look, setting }, `Changed: ${way.label}.`);
                }}
              >
                {way.label}
              </Button>
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
      </div>
    </li>
  );
}
