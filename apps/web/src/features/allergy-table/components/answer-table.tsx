import { memo } from 'react';
import { allergyAnswer, type AllergyAnswer } from '#shared/contracts/menu.ts';
import {
  severities,
  type AllergenId,
  type LabelRegion,
  type Severity,
} from '#shared/contracts/vocabulary.ts';
import { allergenName, declarableAllergens } from '#shared/kitchen/allergen-names.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { controlClasses } from '#web/components/ui/field-frame.tsx';
import { classNames } from '#web/lib/class-names.ts';
import { answerAt, withAnswer, type TableDraft } from '../draft/table-draft.ts';
import { answerNames, severityName } from './severity-names.ts';

type Props = {
  readonly rules: TableDraft['rules'];
  readonly region: LabelRegion;
  readonly onRules: (rules: TableDraft['rules']) => void;
};

/** Without a word for any allergen the rules talk first; so does the table. */
const unsaid: AllergyAnswer = 'talk';

/** Allergen by severity: the owner's word where a cake contains it. */
export const AnswerTable = memo(function AnswerTable({ rules, region, onRules }: Props) {
  const rows: readonly (AllergenId | null)[] = [null, ...declarableAllergens(region)];
  return (
    <div className="grid">
      <div
        aria-hidden="true"
        className="hidden grid-cols-[12rem_repeat(5,minmax(0,1fr))] gap-3 border-b border-seam pb-2 text-sm font-semibold text-slate lg:grid"
      >
        <span>In the cake</span>
        {severities.map((it) => (
          <span key={it}>{severityName(it, region)}</span>
        ))}
      </div>
      {rows.map((allergen) => (
        <fieldset
          key={allergen ?? 'any'}
          className={classNames(
            'grid grid-cols-2 gap-3 border-b border-seam py-3 lg:grid-cols-[12rem_repeat(5,minmax(0,1fr))] lg:items-center',
            allergen === null && 'bg-cloud px-3 lg:-mx-3',
          )}
        >
          <legend className="contents">
            <span className="col-span-2 font-semibold lg:col-span-1">
              {allergen === null ? 'Any allergen' : capitalise(allergenName(allergen, region))}
            </span>
          </legend>
          {severities.map((severity) => (
            <Cell
              key={severity}
              allergen={allergen}
              severity={severity}
              region={region}
              own={answerAt({ rules }, allergen, severity)}
              general={answerAt({ rules }, null, severity) ?? unsaid}
              onAnswer={(answer) => onRules(withAnswer(rules, { allergen, severity }, answer))}
            />
          ))}
        </fieldset>
      ))}
    </div>
  );
});

type CellProps = {
  readonly allergen: AllergenId | null;
  readonly severity: Severity;
  readonly region: LabelRegion;
  readonly own: AllergyAnswer | null;
  readonly general: AllergyAnswer;
  readonly onAnswer: (answer: AllergyAnswer | null) => void;
};

function Cell({ allergen, severity, region, own, general, onAnswer }: CellProps) {
  const said = own ?? general;
  return (
    <label className="grid gap-1">
      <span className="text-sm text-slate lg:sr-only">{severityName(severity, region)}</span>
      <select
        value={own ?? (allergen === null ? unsaid : '')}
        onChange={(event) => {
          const answer = allergyAnswer.safeParse(event.target.value);
          onAnswer(answer.success ? answer.data : null);
        }}
        className={classNames(
          controlClasses(undefined, 'px-2 text-sm'),
          said === 'refuse' && 'text-berry',
          own === null && allergen !== null ? 'font-normal text-slate' : 'font-semibold',
        )}
      >
        {allergen !== null && <option value="">As for any: {answerNames[general]}</option>}
        {allergyAnswer.options.map((it) => (
          <option key={it} value={it}>
            {answerNames[it]}
          </option>
        ))}
      </select>
    </label>
  );
}
