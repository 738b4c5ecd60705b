import type { LabelText } from '#shared/contracts/cards.ts';
import { LabelWords } from '#web/components/label/label-words.tsx';

type Props = { readonly label: LabelText; readonly locale: string };

/** One label as it will read; the printed one may run on over several. */
export function LabelPreview({ label, locale }: Props) {
  const rest = [label.keep, label.remove, label.cautions].filter((it) => it.length > 0);
  return (
    <article className="grid gap-2 rounded-rim border-2 border-cobalt p-4 text-sm sm:p-5">
      <h3 className="text-cobalt">{label.studio.name}</h3>
      <p>
        <strong>{label.product}</strong>
        <br />
        {label.about}
        {label.copies > 1 && `, ${label.copies} boxes`}
      </p>
      <LabelWords label={label} locale={locale} />
      {rest.map((it) => (
        <p key={it.join(' ')}>{it.join(' ')}</p>
      ))}
      {label.homeKitchen !== '' && <p>{label.homeKitchen}</p>}
      <p>
        {label.studio.name}, {label.studio.address}
      </p>
    </article>
  );
}
