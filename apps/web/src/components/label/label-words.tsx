import type { LabelText } from '#shared/contracts/cards.ts';
import { formatDay } from '#shared/dates/format.ts';

type Props = { readonly label: LabelText; readonly locale: string };

/** What a label says about a cake, on a page: the words, not the print. */
export function LabelWords({ label, locale }: Props) {
  const day = (date: string) => formatDay(date, { locale, year: true, weekday: false });
  const aside = [label.signpost, label.makersWarn, label.kitchen].filter((it) => it !== null);
  return (
    <div className="grid gap-2">
      <p>
        <strong>Ingredients: </strong>
        {label.ingredients.map((it, at) =>
          it.emphasised ? <strong key={at}>{it.text}</strong> : it.text,
        )}
      </p>
      {label.contains !== null && (
        <p>
          <strong>{label.contains}</strong>
        </p>
      )}
      {label.notKnown.map((it) => (
        <p key={it} className="font-semibold text-berry">
          {it}
        </p>
      ))}
      {label.mayContain !== null && (
        <p>
          <strong>{label.mayContain}</strong>
        </p>
      )}
      {aside.length > 0 && <p>{aside.join(' ')}</p>}
      <p className="tabular-nums">
        <strong>{label.net.text}</strong>
        {label.useBy !== null && `. Use by ${day(label.useBy)}`}
        {label.madeOn !== null && `. Made on ${day(label.madeOn)}`}.
      </p>
    </div>
  );
}
