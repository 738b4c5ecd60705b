import { Link } from 'react-router-dom';
import type { EggLeftoverView } from '#shared/contracts/kitchen-sheet.ts';
import { formatDay } from '#shared/dates/format.ts';
import { paths } from '#web/config/paths.ts';
import { gramsText } from '#web/lib/grams-text.ts';
import { EggGlyph } from './egg-glyph.tsx';

type Props = { readonly leftovers: readonly EggLeftoverView[]; readonly locale: string };

/** Less than this is a smear in the bowl, grams. */
const worthSayingG = 5;

/** What the plan leaves of each day's eggs, until when, and what it could become. */
export function EggLeftovers({ leftovers, locale }: Props) {
  const said = leftovers.filter((it) => it.whiteG >= worthSayingG || it.yolkG >= worthSayingG);
  if (said.length === 0) return <p>Nothing is left over: every white and yolk is taken.</p>;
  return (
    <div className="grid gap-3">
      <ul className="grid">
        {said.map((it) => (
          <li key={it.crackedOn} className="grid gap-2 border-b border-seam py-3">
            <h3>Cracked {formatDay(it.crackedOn, { locale })}</h3>
            <ul className="grid gap-1">
              {it.whiteG >= worthSayingG && (
                <Left part="white" grams={it.whiteG} useBy={it.whiteUseBy} locale={locale} />
              )}
              {it.yolkG >= worthSayingG && (
                <Left part="yolk" grams={it.yolkG} useBy={it.yolkUseBy} locale={locale} />
              )}
            </ul>
            {it.uses.length > 0 && <Uses uses={it.uses} locale={locale} />}
          </li>
        ))}
      </ul>
      <p className="text-sm text-slate">
        Loose whites and yolks keep 2 to 4 days in the fridge, covered and marked with their day
        (FDA storage chart). Whites may be frozen; yolks freeze badly. Your local food code and your
        license have the last word.
      </p>
    </div>
  );
}

const words = { white: 'whites', yolk: 'yolks' } as const;

function Left({
  part,
  grams,
  useBy,
  locale,
}: {
  readonly part: 'white' | 'yolk';
  readonly grams: number;
  readonly useBy: string | null;
  readonly locale: string;
}) {
  return (
    <li className="flex items-center gap-2">
      <EggGlyph part={part} />
      <span>
        <strong className="tabular-nums">{gramsText(grams, locale)}</strong> of {words[part]}
        {useBy !== null && `, use by ${formatDay(useBy, { locale })}`}
      </span>
    </li>
  );
}

/** More choices than this are no help. */
const mostUses = 4;

function Uses({
  uses,
  locale,
}: {
  readonly uses: EggLeftoverView['uses'];
  readonly locale: string;
}) {
  return (
    <div className="grid gap-0.5">
      <p className="text-sm text-slate">Could become, each by itself:</p>
      <ul>
        {uses.slice(0, mostUses).map((it) => (
          <li key={it.formulaId}>
            <Link
              to={`${paths.staffFormula(it.formulaId)}?make=${Math.floor(it.outG)}`}
              className="link"
            >
              {gramsText(it.outG, locale)} of {it.name}
            </Link>
            {it.pasteurised && (
              <span className="text-sm text-slate">
                {' '}
                (written for pasteurized egg: with raw egg the mix itself must reach its limit on a
                probe, or the egg notice goes with the cake)
              </span>
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}
