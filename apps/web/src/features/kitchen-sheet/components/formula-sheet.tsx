import { Link } from 'react-router-dom';
import type { KitchenFormula, KitchenLine } from '#shared/contracts/kitchen-sheet.ts';
import { formatDuration, formatList } from '#shared/dates/format.ts';
import { paths } from '#web/config/paths.ts';
import { gramsText } from '#web/lib/grams-text.ts';

type Props = { readonly formula: KitchenFormula; readonly locale: string };

/** One formula as the bench weighs it for this order: lines, measures beside them, bowls. */
export function FormulaSheet({ formula, locale }: Props) {
  const grams = (it: number) => gramsText(it, locale);
  const { lines, bowls } = formula;
  return (
    <article className="grid min-w-0 content-start gap-2 break-inside-avoid">
      <header className="grid gap-0.5">
        <h3>
          <Link
            to={`${paths.staffFormula(formula.formulaId)}?make=${Math.ceil(formula.outG)}`}
            className="link text-ink"
          >
            {formula.name}
          </Link>{' '}
          <span className="font-sans text-sm font-normal text-slate">version {formula.n}</span>
        </h3>
        <p className="text-sm text-slate">
          For {formatList(formula.for)}. {amountWords(formula, grams)}
        </p>
        {formula.newer !== null && (
          <p className="text-sm text-slate">
            The order keeps the version it was made with; {formula.newer} is today’s.
          </p>
        )}
        {formula.pasteurised && (
          <p className="text-sm text-slate">
            Written for pasteurized egg.
            {lines.some((it) => it.eggs !== null) &&
              ' With eggs in the shell the mix itself must reach its limit on a probe, or the egg notice goes with the cake; your local food code decides.'}
          </p>
        )}
      </header>
      <ol className="border-t border-seam">
        {lines.map((line, at) => (
          <Line key={`${at} ${line.name}`} line={line} grams={grams} />
        ))}
        <li className="grid grid-cols-[5.5rem_minmax(0,1fr)] gap-x-4 py-1.5">
          <strong className="text-right tabular-nums">{grams(formula.roundedInG)}</strong>
          <span className="text-slate">
            in all{driftWords(formula.driftG, formula.roundedInG, grams)}
          </span>
        </li>
      </ol>
      {bowls !== null && (
        <p className="text-sm">
          <strong>{bowls.mixer}:</strong> {bowls.bowls === 1 ? 'one bowl' : `${bowls.bowls} bowls`}{' '}
          of {grams(bowls.eachG)}
          {bowls.coolingMinutes !== null &&
            `; a bowl takes about ${formatDuration(Math.max(1, Math.round(bowls.coolingMinutes)))} to cool`}
          .
        </p>
      )}
    </article>
  );
}

/** A batter is what is mixed; of the rest, what comes out counts. */
function amountWords(formula: KitchenFormula, grams: (it: number) => string): string {
  return formula.kind === 'sponge'
    ? `${grams(formula.mixG)} of batter, ${grams(formula.outG)} baked.`
    : `Makes ${grams(formula.outG)}.`;
}

/** Roundings that change the whole by half a percent or more are said. */
function driftWords(driftG: number, wholeG: number, grams: (it: number) => string): string {
  if (Math.abs(driftG) < wholeG * 0.005) return '';
  return driftG > 0
    ? `, ${grams(driftG)} over by rounding`
    : `, ${grams(-driftG)} under by rounding`;
}

function Line({
  line,
  grams,
}: {
  readonly line: KitchenLine;
  readonly grams: (it: number) => string;
}) {
  const eggs = line.eggs === null ? null : line.eggs === 1 ? '1 egg' : `${line.eggs} eggs`;
  const beside = line.household ?? eggs;
  return (
    <li className="grid grid-cols-[5.5rem_minmax(0,1fr)] gap-x-4 border-b border-seam py-1.5 sm:grid-cols-[5.5rem_minmax(0,1fr)_auto] print:grid-cols-[5.5rem_minmax(0,1fr)_auto] print:py-1">
      <span className="text-right font-semibold whitespace-nowrap tabular-nums">
        {grams(line.roundedG)}
      </span>
      <span className="min-w-0">
        {line.name}
        {line.formula && <span className="text-sm text-slate"> (its own formula)</span>}
        {isFar(line) && grams(line.exactG) !== grams(line.roundedG) && (
          <span className="text-sm whitespace-nowrap text-slate">
            {' '}
            ({grams(line.exactG)} exactly)
          </span>
        )}
      </span>
      <span className="text-sm text-slate tabular-nums empty:hidden max-sm:col-start-2 print:col-start-auto">
        {beside}
      </span>
    </li>
  );
}

/** Where rounding moved a line by a percent or more (whole eggs, mostly). */
function isFar({ exactG, driftG }: KitchenLine): boolean {
  return Math.abs(driftG) >= exactG / 100;
}
