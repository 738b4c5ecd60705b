import { Link } from 'react-router-dom';
import { formatHousehold } from '#shared/kitchen/formulas/household.ts';
import type { PantryIndex } from '#shared/kitchen/formulas/pantry-index.ts';
import type { PercentView } from '#shared/kitchen/formulas/percents.ts';
import type { ScaledFormula, ScaledLine } from '#shared/kitchen/formulas/scale-formula.ts';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import { paths } from '#web/config/paths.ts';
import { figure } from '#web/lib/figure.ts';
import { gramsText } from '#web/lib/grams-text.ts';
import { percentText } from './formula-words.ts';

type Props = {
  readonly scaled: ScaledFormula;
  /** Percent instead of household measures. */
  readonly percents: PercentView | null;
  readonly index: PantryIndex;
  readonly locale: string;
};

/** What to weigh: grams as the scale shows them, beside them measures or percent, and the drift. */
export function ScaledLines({ scaled, percents, index, locale }: Props) {
  return (
    <ol className="border-t border-seam">
      {scaled.lines.map((line) => (
        <li
          key={line.line}
          className="grid grid-cols-[6.5rem_minmax(0,1fr)] items-baseline gap-x-4 gap-y-0.5 border-b border-seam py-2.5 sm:grid-cols-[7rem_minmax(0,1fr)_9rem] print:grid-cols-[7rem_minmax(0,1fr)_9rem] print:py-1.5"
        >
          <span className="text-right tabular-nums">
            <span className="font-display text-xl font-semibold whitespace-nowrap">
              {gramsText(line.roundedG, locale)}
            </span>
            <Drift line={line} locale={locale} />
          </span>
          <span className="min-w-0">
            <PartName line={line} index={index} />
            {percents !== null && line.eggs !== null && (
              <span className="text-slate">
                , {line.eggs.count} {line.eggs.count === 1 ? 'egg' : 'eggs'}
              </span>
            )}
          </span>
          <span className="text-sm text-slate tabular-nums empty:hidden max-sm:col-start-2 sm:text-right print:col-start-auto print:text-right">
            {percents === null
              ? householdOf(line)
              : percentText(percents.lines[line.line] ?? 0, locale)}
          </span>
        </li>
      ))}
    </ol>
  );
}

function householdOf(line: ScaledLine): string {
  if (line.part.kind !== 'ingredient') return '';
  return formatHousehold(line.part.ingredient, line.roundedG) ?? '';
}

type NameProps = { readonly line: ScaledLine; readonly index: PantryIndex };

function PartName({ line, index }: NameProps) {
  const { part } = line;
  if (part.kind === 'missing') {
    return (
      <span className="inline-flex items-center gap-1.5 font-semibold text-berry">
        <ToneGlyph tone="berry" className="size-4" />
        not in the pantry
      </span>
    );
  }
  if (part.kind === 'ingredient') {
    return (
      <Link to={paths.staffIngredient(part.ingredient.id)} className="hover:underline">
        {part.name}
      </Link>
    );
  }
  const newest =
    part.formula === null ? undefined : index.versions.get(part.formula.currentVersionId);
  return (
    <>
      <Link
        to={`${paths.staffFormula(part.version.formulaId)}?make=${Math.ceil(line.roundedG)}${part.version.id === newest?.id ? '' : `&version=${part.version.n}`}`}
        className="link"
      >
        {part.name}
      </Link>
      <span className="text-sm text-slate">
        {' '}
        version {part.version.n}
        {newest !== undefined && newest.id !== part.version.id && `; ${newest.n} is the newest`}
      </span>
    </>
  );
}

/** Under half a percent nothing is said at the line; the whole says its own above. */
const toldFromPpm = 5000;

function Drift({ line, locale }: { readonly line: ScaledLine; readonly locale: string }) {
  if (Math.abs(line.driftPpm) < toldFromPpm) return null;
  const percent = figure(line.driftPpm / 10_000, locale, 1, 'exceptZero');
  return <span className="block text-sm text-slate print:hidden">{percent} %</span>;
}
