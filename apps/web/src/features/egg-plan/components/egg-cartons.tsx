import type { CartonInsteadView, EggCartonView } from '#shared/contracts/kitchen-sheet.ts';
import { formatDay, formatList } from '#shared/dates/format.ts';
import { gramsText } from '#web/lib/grams-text.ts';

const cartonsText = (count: number) => `${count} ${count === 1 ? 'carton' : 'cartons'}`;

/** Pasteurised egg out of cartons: how many to open on which day. */
export function EggCartons({
  cartons,
  locale,
}: {
  readonly cartons: readonly EggCartonView[];
  readonly locale: string;
}) {
  return (
    <div className="grid gap-3">
      <ul>
        {cartons.map((it) => (
          <li key={it.name} className="grid gap-1 border-b border-seam py-3">
            <p>
              <strong>{it.name}</strong>, {gramsText(it.grams, locale)} for{' '}
              {formatList(it.formulas)}
            </p>
            {it.plan === null ? (
              <p className="text-sm">
                <strong>Nobody has written what a carton holds</strong>, so they cannot be counted.
              </p>
            ) : (
              <>
                <ul>
                  {it.plan.days.map((day) => (
                    <li key={day.date}>
                      {formatDay(day.date, { locale })}: open {cartonsText(day.open)}, used up by{' '}
                      {formatDay(day.useBy, { locale })}
                    </li>
                  ))}
                </ul>
                <p className="text-sm text-slate">
                  {gramsText(it.plan.leftG, locale)} of the {cartonsText(it.plan.cartons)} left
                  over.
                </p>
              </>
            )}
          </li>
        ))}
      </ul>
      <p className="text-sm text-slate">
        Liquid pasteurized egg keeps 10 days unopened and 3 opened, chilled (FDA storage chart); the
        maker’s own date goes before it.
      </p>
    </div>
  );
}

/** Formulas that could take a carton instead of cracked eggs, and what that would save. */
export function CartonsInstead({
  alternatives,
  locale,
}: {
  readonly alternatives: readonly CartonInsteadView[];
  readonly locale: string;
}) {
  return (
    <ul>
      {alternatives.map((it) => (
        <li key={it.formulaId} className="grid gap-1 border-b border-seam py-3">
          <p>
            <strong>{it.formula}</strong> from {it.carton.toLowerCase()}:{' '}
            {it.cartons === 0
              ? 'what is open already does'
              : `${cartonsText(it.cartons)} more for its ${gramsText(it.grams, locale)}`}
            , and {it.eggs} eggs to crack in all instead of {it.eggs + it.fewer}.
          </p>
          {it.whipped && (
            <p className="text-sm">
              Many carton whites whip poorly into a meringue: try yours on a small batch before a
              cake depends on it.
            </p>
          )}
        </li>
      ))}
    </ul>
  );
}
