import type { Extra } from '#shared/contracts/design.ts';
import { formatMoney } from '#shared/kitchen/money.ts';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { NumberField } from '#web/components/ui/number-field.tsx';
import { useProblemAt } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

/** What goes with the cake: candles, a knife. */
export function ExtraFields() {
  const { menu, values, change } = useWizard();
  const { extras } = values;
  if (menu.extras.length === 0) return null;
  const put = (next: Extra[]) => change({ extras: next });
  return (
    <section className="grid gap-3" aria-labelledby="extras-heading">
      <h2 id="extras-heading">To go with it</h2>
      <ul className="grid divide-y divide-seam">
        {menu.extras.map((it) => {
          const at = extras.findIndex((chosen) => chosen.extraId === it.id);
          const chosen = extras[at];
          return (
            <li key={it.id} className="grid gap-3 py-2 sm:grid-cols-[1fr_auto] sm:items-center">
              <Checkbox
                name={`extras.${it.id}`}
                label={`${it.name}, ${formatMoney(it.priceMinor, menu.priceBook.currency, menu.studio.locale)}`}
                hint={it.blurb}
                checked={chosen !== undefined}
                onChange={(event) =>
                  put(
                    event.target.checked
                      ? [...extras, { extraId: it.id, quantity: 1 }]
                      : extras.filter((one) => one.extraId !== it.id),
                  )
                }
              />
              {chosen !== undefined && (
                <ExtraQuantity
                  at={at}
                  extra={chosen}
                  label={`How many: ${it.name}`}
                  onChange={(next) => put(extras.map((one, i) => (i === at ? next : one)))}
                />
              )}
            </li>
          );
        })}
      </ul>
    </section>
  );
}

type QuantityProps = {
  readonly at: number;
  readonly extra: Extra;
  readonly label: string;
  readonly onChange: (extra: Extra) => void;
};

function ExtraQuantity({ at, extra, label, onChange }: QuantityProps) {
  const problem = useProblemAt(`extras.${at}.quantity`);
  return (
    <NumberField
      name={`extras.${at}.quantity`}
      label={label}
      error={problem}
      value={extra.quantity}
      onValue={(value) => onChange({ ...extra, quantity: value ?? Number.NaN })}
    />
  );
}
