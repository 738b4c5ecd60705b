import type { Contents } from '#shared/contracts/menu.ts';
import { formatList } from '#shared/dates/format.ts';
import { capitalise } from '#shared/kitchen/sentences.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { clashesOf, containsLine } from '../../design/contains.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

/** A sponge or a filling as the menu has it. */
type PartOnMenu = {
  readonly id: string;
  readonly name: string;
  readonly blurb: string;
  readonly contents: Contents;
  readonly surchargePerPortionMinor: number;
};

type Props = {
  readonly name: string;
  readonly label: string;
  readonly parts: readonly PartOnMenu[];
  readonly value: string | null;
  /** What "none" is called, where there may be none. */
  readonly none?: string;
  readonly error: string | undefined;
  readonly onValue: (id: string | null) => void;
};

/** One sponge or filling: what it is, what it contains, and which guest it goes against. */
export function PartChoice({ name, label, parts, value, none, error, onValue }: Props) {
  const { menu, values } = useWizard();
  const { labelRegion, locale } = menu.studio;
  const { allergies, diets } = values.day;
  const chosen = parts.find((it) => it.id === value);
  const against = (contents: Contents) => clashesOf(contents, allergies, diets, labelRegion);
  const clashes = chosen === undefined ? [] : against(chosen.contents);
  const more = (it: PartOnMenu) =>
    it.surchargePerPortionMinor > 0
      ? `, +${formatMoney(it.surchargePerPortionMinor, menu.priceBook.currency, locale)} a portion`
      : '';
  return (
    <div className="grid content-start gap-1.5">
      <Select
        name={name}
        label={label}
        error={error}
        value={value ?? ''}
        onChange={(event) => onValue(event.target.value || null)}
      >
        {none !== undefined && <option value="">{none}</option>}
        {none === undefined && value === null && <option value="">Choose one</option>}
        {parts.map((it) => (
          <option key={it.id} value={it.id}>
            {it.name}
            {more(it)}
            {against(it.contents).length > 0 &&
              ` (does not suit: ${formatList(against(it.contents))})`}
          </option>
        ))}
      </Select>
      {chosen !== undefined && (
        <p className="text-sm text-slate">
          {chosen.blurb} {capitalise(containsLine(chosen.contents, labelRegion))}.
        </p>
      )}
      {clashes.length > 0 && (
        <p className="flex gap-2 text-sm font-semibold text-berry">
          <ToneGlyph tone="berry" />
          Does not suit your table: {formatList(clashes)}.
        </p>
      )}
    </div>
  );
}
