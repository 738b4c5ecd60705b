import type { EggDayView, EggUseView } from '#shared/contracts/kitchen-sheet.ts';
import { formatDay, formatWeekday } from '#shared/dates/format.ts';
import { gramsText } from '#web/lib/grams-text.ts';
import { EggGlyph } from './egg-glyph.tsx';
import { OrderLinks } from './whose-orders.tsx';

type Props = { readonly days: readonly EggDayView[]; readonly locale: string };

/** Day by day: eggs to crack, and what each part goes into. */
export function EggDays({ days, locale }: Props) {
  return (
    <ol>
      {days.map((day) => (
        <li
          key={day.date}
          className="grid gap-x-8 gap-y-2 border-b border-seam px-5 py-4 break-inside-avoid last:border-b-0 sm:grid-cols-[13rem_minmax(0,1fr)] sm:px-7 print:grid-cols-[12rem_minmax(0,1fr)] print:px-0 print:py-2"
        >
          <div className="grid content-start gap-0.5">
            <h2 className="text-lg">{formatDay(day.date, { locale })}</h2>
            {day.crack === 0 ? (
              <p className="text-slate">Crack none: what is left does.</p>
            ) : (
              <>
                <p className="flex items-center gap-1.5">
                  <EggGlyph part="whole" />
                  <span>
                    Crack{' '}
                    <strong className="font-display text-2xl tabular-nums">{day.crack}</strong>
                  </span>
                </p>
                <p className="text-sm text-slate">{separateWords(day)}</p>
              </>
            )}
          </div>
          <ul className="grid content-start">
            {day.uses.map((use) => (
              <Use key={`${use.formula} ${use.part}`} use={use} date={day.date} locale={locale} />
            ))}
          </ul>
        </li>
      ))}
    </ol>
  );
}

function separateWords({ crack, whole }: EggDayView): string {
  const apart = crack - whole;
  if (whole === 0) return apart === 1 ? 'Separate it.' : 'Separate them all.';
  if (apart === 0) return 'They go in whole.';
  return `${whole} ${whole === 1 ? 'goes' : 'go'} in whole, ${apart} separated.`;
}

/** Less is not worth getting out of the fridge first, grams. */
const worthTakingG = 5;

const partWords = { whole: 'whole egg', white: 'whites', yolk: 'yolks' } as const;

function Use({
  use,
  date,
  locale,
}: {
  readonly use: EggUseView;
  readonly date: string;
  readonly locale: string;
}) {
  const older = use.from.filter((it) => it.crackedOn < date && it.grams >= worthTakingG);
  return (
    <li className="grid grid-cols-[4.5rem_1.5rem_minmax(0,1fr)] gap-x-3 py-1">
      <span className="text-right font-semibold whitespace-nowrap tabular-nums">
        {gramsText(use.grams, locale)}
      </span>
      <EggGlyph part={use.part} />
      <span className="min-w-0">
        {partWords[use.part]} for {use.formula},{' '}
        <span className="text-sm text-slate">
          <OrderLinks numbers={use.orders} />
        </span>
        {older.length > 0 && (
          <span className="block text-sm text-slate">
            Take first{' '}
            {older
              .map(
                (it) =>
                  `${gramsText(it.grams, locale)} of ${partWords[it.part]} from ${formatWeekday(it.crackedOn, 'long', locale)}`,
              )
              .join(', ')}
            .
          </span>
        )}
      </span>
    </li>
  );
}
