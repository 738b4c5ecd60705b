import type { Blocker, StaffOrder } from '#shared/contracts/staff.ts';
import type { StudioCard } from '#shared/contracts/menu.ts';
import { AdviceNote, byGravity } from '#web/components/order/advice-note.tsx';
import { instantWords } from '#web/components/order/order-times.ts';
import { plainly } from '#web/components/order/plainly.ts';
import { LiftStop, RecordTalk } from './settle-forms.tsx';

type Props = { readonly order: StaffOrder; readonly studio: StudioCard };

/** What must be settled before the order may be confirmed, each with the next thing to do. */
export function OpenStops({ order, studio }: Props) {
  return (
    <ul className="grid gap-4">
      {byGravity(order.blockers)
        // What waits for the customer stands with its reason, among what was lifted.
        .filter((it) => it.waitsFor !== 'customer')
        .map((it) => (
          <li key={`${it.code} ${it.about}`} className="grid gap-2">
            <AdviceNote advice={plainly(it)} />
            {it.talked !== null && (
              <p className="ml-6.5">
                <strong>Talked over:</strong> {it.talked.text}{' '}
                <span className="text-sm text-slate">
                  ({it.talked.by}, {instantWords(it.talked.at, studio.zone, studio.locale)})
                </span>
              </p>
            )}
            <NextStep order={order} blocker={it} />
          </li>
        ))}
    </ul>
  );
}

const allergyCodes: readonly Blocker['code'][] = ['allergen', 'allergen-unknown', 'kitchen'];

/** The one thing that brings it further, or who can do it. */
function NextStep({ order, blocker }: { readonly order: StaffOrder; readonly blocker: Blocker }) {
  switch (blocker.waitsFor) {
    case 'answer':
      return <p className="text-sm">Answer it at the allergy: record the talk there.</p>;
    case 'talk':
      if (allergyCodes.includes(blocker.code)) {
        return (
          <p className="text-sm">
            First talk with them and record it at the allergy. Only then may the owner take it.
          </p>
        );
      }
      return order.can.recordTalk ? (
        <RecordTalk order={order} blocker={blocker} />
      ) : (
        <p className="text-sm">Nobody has talked with them about it yet.</p>
      );
    case 'reason':
      return order.can.liftStop ? (
        <LiftStop order={order} blocker={blocker} />
      ) : (
        <p className="text-sm">
          Only the owner takes an order against a stop, with a written reason.
        </p>
      );
    case 'nothing':
      return (
        <p className="text-sm">
          No reason lifts this: have the cake changed, or decline the order.
        </p>
      );
    case 'customer':
      return null;
  }
}
