import type { Advice } from '#shared/contracts/estimates.ts';
import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { allergenLabel } from '#shared/kitchen/allergen-names.ts';
import { formatList } from '#shared/dates/format.ts';
import { allergyWords } from '#web/components/order/allergy-words.ts';

type Props = { readonly order: StaffOrder; readonly menu: Menu };

/** What comes off or out before the cake is eaten. */
const takenOut: readonly Advice['code'][] = ['supports', 'inedible', 'small-parts', 'flowers'];

/** What is said aloud when a cake changes hands: its allergens, the guests', what comes out. */
export function SayAtHandover({ order, menu }: Props) {
  const { allergies, estimate } = order;
  const region = menu.studio.labelRegion;
  const inIt = estimate.allergens.filter((it) => it.state === 'contains');
  const maybe = estimate.allergens.filter(
    (it) => it.state === 'may-contain' || it.state === 'unknown',
  );
  const names = (entries: typeof inIt) =>
    formatList([...new Set(entries.map((it) => allergenLabel(it, region)))]);
  const out = estimate.advice.filter((it) => takenOut.includes(it.code));
  return (
    <section
      aria-labelledby="say-title"
      className="grid gap-3 rounded-action border-2 border-berry bg-berry-tint px-4 py-3"
    >
      <h3 id="say-title">Say this as you hand it over</h3>
      {allergies.length > 0 && (
        <ul className="grid gap-1">
          {allergies.map((it) => (
            <li key={it.id} className="font-semibold text-berry">
              {allergyWords(it, region)}
              {it.answer !== null && (
                <span className="font-normal text-ink">. Settled: {it.answer.text}</span>
              )}
            </li>
          ))}
        </ul>
      )}
      <p>
        <strong>Contains:</strong>{' '}
        {inIt.length === 0 ? 'no allergen named on its labels' : names(inIt)}.
        {maybe.length > 0 && ` May contain, or not settled by the label: ${names(maybe)}.`}
      </p>
      {out.length > 0 && (
        <div className="grid gap-1">
          <p className="font-semibold">Before eating</p>
          <ul className="grid gap-1">
            {out.map((it) => (
              <li key={`${it.code} ${it.about}`}>
                {it.sentence} {it.instead}
              </li>
            ))}
          </ul>
        </div>
      )}
      {estimate.keepCool !== '' && <p>{estimate.keepCool}</p>}
    </section>
  );
}
