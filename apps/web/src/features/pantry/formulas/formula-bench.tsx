import { useMemo, useState } from 'react';
import type { Menu } from '#shared/contracts/menu.ts';
import type { Formula, FormulaVersion } from '#shared/contracts/pantry.ts';
import { bowlsFor, coolingMinutes } from '#shared/kitchen/formulas/bowls.ts';
import { percentsOf } from '#shared/kitchen/formulas/percents.ts';
import { type ScaledFormula, scaleFormula } from '#shared/kitchen/formulas/scale-formula.ts';
import { mixedG } from '#shared/kitchen/formulas/totals.ts';
import { formatWeight } from '#shared/kitchen/measures.ts';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { ChipChoice } from '#web/components/ui/chips.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { figure } from '#web/lib/figure.ts';
import type { Shelf } from '../shelf.ts';
import { gramsText } from '#web/lib/grams-text.ts';
import { MakeFields } from './make-fields.tsx';
import { type MakeAsked, makeAmount } from './make-amount.ts';
import { type PercentChoice, percentBase, percentChoices } from './percent-choice.ts';
import { ScaledLines } from './scaled-lines.tsx';
import { StepList } from './step-list.tsx';
import { tierRole } from './tier-need.ts';

type Props = {
  readonly formula: Formula;
  readonly version: FormulaVersion;
  readonly shelf: Shelf;
  readonly menu: Menu;
  /** Grams asked for by the address: what another formula takes of this one. */
  readonly makeG: string | null;
};

/** The formula as it is worked with: how much, what to weigh, what to do; printed for the bench. */
export function FormulaBench({ formula, version, shelf, menu, makeG }: Props) {
  const { pantry, index } = shelf;
  const { locale, temperatureLead, lengthLead } = menu.studio;
  const [asked, setAsked] = useState<MakeAsked>(() => ({
    by: makeG === null ? 'written' : 'weight',
    weight: makeG === null ? '' : `${makeG} g`,
    tiers: '3',
    size: Math.max(
      0,
      menu.tierSizes.findIndex((it) => it.shape === 'round' && it.widthMm >= 200),
    ),
    heightMm: 102,
    layers: '2',
    bowls: '1',
    mixerId: pantry.mixers.at(-1)?.id ?? '',
  }));
  const [view, setView] = useState<'measures' | 'percent'>('measures');
  const choices = percentChoices(version, index);
  const [of, setOf] = useState<PercentChoice>(choices[0]?.value ?? 'line-0');
  const [oneBowl, setOneBowl] = useState(false);

  const made = useMemo(
    () => makeAmount(asked, { formula, version, pantry, index, menu }),
    [asked, formula, version, pantry, index, menu],
  );
  const whole = made.ok ? made.scaled : null;
  const bowls =
    whole !== null && pantry.mixers.some((it) => it.capacityG > 0) && usesMixer(version)
      ? bowlsFor(mixedG(version, whole.exactOutG), pantry.mixers)
      : null;
  const several = bowls !== null && bowls.bowls > 1;
  const scaled =
    whole !== null && several && oneBowl
      ? scaleFormula(version, index, { factor: whole.factor / bowls.bowls })
      : whole;
  const cools =
    whole === null || bowls === null ? null : coolingMinutes(version, index, bowls.eachG);

  return (
    <Rim label="At the bench" className="grid gap-6 p-5 sm:p-7 print:border-0 print:p-0">
      <MakeFields
        asked={asked}
        fault={made.ok ? null : made}
        forTiers={tierRole(formula, pantry.parts) !== null}
        menu={menu}
        pantry={pantry}
        onAsked={(patch) => setAsked((now) => ({ ...now, ...patch }))}
      />
      {!made.ok && made.field === null && <Notice tone="berry" title={made.message} />}
      {scaled !== null && (
        <>
          <Amounts scaled={scaled} lead={lengthLead} locale={locale} />
          {bowls !== null && (
            <div className="-mt-3 grid gap-1">
              <p className="text-slate">
                {several ? `${bowls.bowls} bowls of ${gramsText(bowls.eachG, locale)}` : 'One bowl'}
                : the {bowls.mixer.name} takes {gramsText(bowls.mixer.capacityG, locale)}.
                {cools !== null &&
                  cools >= 1 &&
                  ` A bowl takes about ${Math.round(cools)} min to cool; the probe has the word.`}
              </p>
              {several && (
                <Checkbox
                  label="Weigh for one bowl"
                  checked={oneBowl}
                  onChange={(event) => setOneBowl(event.target.checked)}
                />
              )}
            </div>
          )}
          <div>
            <div
              data-print="no"
              className="mb-2 flex flex-wrap items-end gap-x-4 gap-y-2 print:hidden"
            >
              <ChipChoice
                legend={<span className="sr-only">Beside the grams</span>}
                value={view}
                onValue={setView}
                chips={[
                  { value: 'measures', label: 'Measures' },
                  { value: 'percent', label: 'Percent' },
                ]}
              />
              {view === 'percent' && (
                <Select
                  label={<span className="sr-only">Percent of</span>}
                  value={of}
                  onChange={(event) => setOf(event.target.value)}
                >
                  {choices.map((it) => (
                    <option key={it.value} value={it.value}>
                      of {it.label}
                    </option>
                  ))}
                </Select>
              )}
            </div>
            <ScaledLines
              scaled={scaled}
              percents={view === 'percent' ? percentsOf(version, index, percentBase(of)) : null}
              index={index}
              locale={locale}
            />
          </div>
        </>
      )}
      <div className="grid gap-3">
        <h2>Steps</h2>
        <StepList
          version={version}
          scaled={scaled}
          altitudeM={pantry.altitudeM}
          lead={temperatureLead}
          lengthLead={lengthLead}
          locale={locale}
        />
      </div>
    </Rim>
  );
}

/** What comes out, what goes in, and how far the rounding takes it. */
function Amounts({
  scaled,
  lead,
  locale,
}: {
  readonly scaled: ScaledFormula;
  readonly lead: 'in' | 'cm';
  readonly locale: string;
}) {
  const drift = scaled.driftPpm / 10_000;
  return (
    <div className="flex flex-wrap items-baseline gap-x-8 gap-y-2" role="status">
      <p>
        <span className="block font-display text-3xl font-bold tabular-nums">
          {gramsText(scaled.roundedOutG, locale)}
        </span>
        <span className="text-sm text-slate">
          comes out, {formatWeight(scaled.roundedOutG, lead)}
        </span>
      </p>
      <p>
        <span className="block font-display text-xl font-semibold tabular-nums">
          {gramsText(scaled.roundedInG, locale)}
        </span>
        <span className="text-sm text-slate">goes in</span>
      </p>
      <p>
        <span className="block font-display text-xl font-semibold tabular-nums">
          {figure(scaled.driftG, locale, 1, 'exceptZero')} g
        </span>
        <span className="text-sm text-slate">
          by rounding, {figure(drift, locale, 2, 'exceptZero')} %
        </span>
      </p>
    </div>
  );
}

function usesMixer(version: FormulaVersion): boolean {
  return version.steps.some((it) => it.resource === 'mixer');
}
