import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { AdviceNote, byGravity } from '#web/components/order/advice-note.tsx';
import { allergyWords } from '#web/components/order/allergy-words.ts';
import { instantWords } from '#web/components/order/order-times.ts';
import { classNames } from '#web/lib/class-names.ts';
import { AnswerAllergy, LiftStop } from './settle-forms.tsx';

type Props = { readonly order: StaffOrder; readonly menu: Menu };

/**
 * What could hurt somebody, before anything else: the guests' allergies with what was settled, and
 * what must be settled before the order may be confirmed.
 */
export function CareBlock({ order, menu }: Props) {
  const { allergies, blockers } = order;
  if (allergies.length === 0 && blockers.length === 0) return null;
  const blocking = new Set(blockers.map((it) => `${it.code} ${it.about}`));
  const about = order.estimate.advice.filter(
    (it) =>
      it.level !== 'ok' &&
      (it.code === 'allergen' || it.code === 'kitchen' || it.code === 'allergen-unknown') &&
      !blocking.has(`${it.code} ${it.about}`),
  );
  return (
    <section
      id="settle"
      aria-labelledby="settle-title"
      tabIndex={-1}
      className="grid gap-5 rounded-action border-2 border-berry bg-berry-tint px-4 py-4 sm:px-6"
    >
      <h2 id="settle-title">
        {allergies.length > 0 ? 'Allergies at the table' : 'Settle this before you confirm'}
      </h2>
      <div
        className={classNames(
          'grid items-start gap-x-10 gap-y-5',
          allergies.length > 0 && blockers.length > 0 && 'lg:grid-cols-2',
        )}
      >
        {allergies.length > 0 && (
          <ul className="grid gap-4">
            {allergies.map((it) => (
              <li key={it.id} className="grid gap-2">
                <p className="font-display text-lg font-semibold text-berry">
                  {allergyWords(it, menu.studio.labelRegion)}
                </p>
                {it.allergen !== null && it.text !== '' && <p>“{it.text}”</p>}
                {it.answer !== null ? (
                  <p>
                    <strong>Settled:</strong> {it.answer.text}{' '}
                    <span className="text-sm text-slate">
                      ({it.answer.by},{' '}
                      {instantWords(it.answer.at, menu.studio.zone, menu.studio.locale)})
                    </span>
                  </p>
                ) : order.can.answerAllergy ? (
                  <AnswerAllergy order={order} allergy={it} />
                ) : (
                  <p className="text-sm">Nobody has talked with them about it yet.</p>
                )}
              </li>
            ))}
          </ul>
        )}
        {blockers.length > 0 && (
          <div className="grid gap-3">
            {allergies.length > 0 && <h3>Settle this before you confirm</h3>}
            <ul className="grid gap-4">
              {byGravity(blockers).map((it) => (
                <li key={`${it.code} ${it.about}`} className="grid gap-2">
                  <AdviceNote advice={it} />
                  {order.can.liftStop && it.talk && <LiftStop order={order} blocker={it} />}
                </li>
              ))}
            </ul>
            {!order.can.liftStop && blockers.some((it) => it.talk) && (
              <p className="text-sm">
                Only the owner takes an order against a stop, with a written reason.
              </p>
            )}
          </div>
        )}
      </div>
      {about.length > 0 && (
        <ul className="grid gap-3">
          {byGravity(about).map((it) => (
            <li key={`${it.code} ${it.about}`}>
              {/* What else could have been chosen is past where a stop was lifted. */}
              <AdviceNote advice={it.level === 'stop' ? { ...it, instead: '' } : it} />
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}
