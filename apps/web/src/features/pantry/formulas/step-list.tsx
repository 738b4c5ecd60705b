import type { FormulaVersion } from '#shared/contracts/pantry.ts';
import { formatDuration } from '#shared/dates/format.ts';
import { formatSyrupTarget } from '#shared/kitchen/formulas/syrup.ts';
import {
  type LengthLead,
  type TemperatureLead,
  formatBenchTemperature,
  mmToInches,
} from '#shared/kitchen/measures.ts';
import type { ScaledFormula } from '#shared/kitchen/formulas/scale-formula.ts';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import { figure } from '#web/lib/figure.ts';
import { gramsText } from '#web/lib/grams-text.ts';
import { limitTime, resourceWords } from './formula-words.ts';

type Props = {
  readonly version: FormulaVersion;
  readonly scaled: ScaledFormula | null;
  readonly altitudeM: number;
  readonly lead: TemperatureLead;
  readonly lengthLead: LengthLead;
  readonly locale: string;
};

/** What is done, in order: what goes in, what is measured, how long it takes. */
export function StepList({ version, scaled, altitudeM, lead, lengthLead, locale }: Props) {
  if (version.steps.length === 0) {
    return <p className="text-slate">No steps are written for it yet.</p>;
  }
  return (
    <ol className="divide-y divide-seam border-y border-seam">
      {version.steps.map((step, at) => (
        <li key={at} className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 py-3.5 print:py-2">
          <span className="grid size-9 place-items-center rounded-action border-[1.5px] border-ink font-display font-semibold tabular-nums">
            {at + 1}
          </span>
          <div className="grid min-w-0 gap-1">
            <p className="font-semibold">{step.text}</p>
            <GoesIn at={at} version={version} scaled={scaled} locale={locale} />
            {step.syrupTargetC !== null && (
              <>
                <p>
                  Boil to <strong>{formatSyrupTarget(step.syrupTargetC, altitudeM, lead)}</strong>
                  {altitudeM > 0 && (
                    <span className="text-slate">
                      {' '}
                      here, {heightText(altitudeM, lengthLead, locale)} up; at sea level{' '}
                      {formatBenchTemperature(step.syrupTargetC, lead)}
                    </span>
                  )}
                </p>
                <p className="flex items-start gap-1.5 text-sm">
                  <ToneGlyph tone="butter" className="mt-0.5 size-4" />
                  Hot syrup burns: pour slowly, away from the whisk.
                </p>
              </>
            )}
            {step.critical !== null && (
              <p className="flex items-start gap-1.5">
                <Probe />
                <span>
                  Measure <strong>{formatBenchTemperature(step.critical.limitC, lead)}</strong>
                  {step.critical.seconds !== null &&
                    ` ${step.critical.limitC >= heldFromC ? 'for' : 'within'} ${limitTime(step.critical.seconds)}`}
                  {step.critical.note !== '' && (
                    <span className="text-slate">. {step.critical.note}</span>
                  )}
                </span>
              </p>
            )}
            <p className="text-sm text-slate">{timesOf(step)}</p>
          </div>
        </li>
      ))}
    </ol>
  );
}

/** The studio's height above the sea; 1 ft is 12 in. */
function heightText(metres: number, lead: LengthLead, locale: string): string {
  return lead === 'cm'
    ? `${figure(metres, locale, 0)} m`
    : `${figure(mmToInches(metres * 1000) / 12, locale, 0)} ft`;
}

/** Above this a limit is heat to be held; under it, cold to be reached in time. */
const heldFromC = 60;

function timesOf(step: FormulaVersion['steps'][number]): string {
  return [
    step.activeMinutes > 0 ? `${formatDuration(step.activeMinutes)} of work` : '',
    step.waitingMinutes > 0 ? `${formatDuration(step.waitingMinutes)} waiting` : '',
    resourceWords[step.resource],
  ]
    .filter((it) => it !== '')
    .join(', ');
}

type InProps = Pick<Props, 'version' | 'scaled' | 'locale'> & { readonly at: number };

function GoesIn({ at, version, scaled, locale }: InProps) {
  const lines = version.lines.flatMap((line, index) => {
    const weighed = scaled?.lines[index];
    return line.step === at && weighed !== undefined
      ? [`${gramsText(weighed.roundedG, locale)} ${weighed.part.name}`]
      : [];
  });
  if (lines.length === 0) return null;
  return <p className="text-sm">In: {lines.join('; ')}</p>;
}

function Probe() {
  return (
    <svg viewBox="0 0 16 20" className="mt-0.5 h-5 shrink-0 text-cobalt" aria-hidden="true">
      <path
        d="M8 2a2 2 0 0 1 2 2v7.2a4 4 0 1 1-4 0V4a2 2 0 0 1 2-2z"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.6"
      />
      <path d="M8 7v6" stroke="currentColor" strokeWidth="1.8" strokeLinecap="round" />
      <circle cx="8" cy="14.6" r="1.8" fill="currentColor" />
    </svg>
  );
}
