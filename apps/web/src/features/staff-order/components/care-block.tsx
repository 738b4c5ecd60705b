import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { AdviceNote, byGravity } from '#web/components/order/advice-note.tsx';
import { allergyWords } from '#web/components/order/allergy-words.ts';
import { instantWords } from '#web/components/order/order-times.ts';
import { plainly } from '#web/components/order/plainly.ts';
import { classNames } from '#web/lib/class-names.ts';
import { LiftedStops } from './lifted-stops.tsx';
import { OpenStops } from './open-stops.tsx';
import { AnswerAllergy } from './settle-forms.tsx';

type Props = { readonly order: StaffOrder; readonly menu: Menu };

/**
 * What could hurt somebody, before anything else: the guests' allergies with what was settled, and
 * what must be settled before the order may be confirmed.
 */
export function CareBlock({ order, menu }: Props) {
  const { allergies, blockers, lifted } = order;
  if (allergies.length === 0 && blockers.length === 0 && lifted.length === 0) return null;
  const open = blockers.filter((it) => it.waitsFor !== 'customer');
  const stops = open.length > 0 || lifted.length > 0;
  const said = new Set([...blockers, ...lifted].map((it) => `${it.code} ${it.about}`));
  const about = order.estimate.advice.filter(
    (it) =>
      it.level !== 'ok' &&
      (it.code === 'allergen' || it.code === 'kitchen' || it.code === 'allergen-unknown') &&
      !said.has(`${it.code} ${it.about}`),
  );
  return (
    <section
      id="settle"
      aria-labelledby="settle-title"
      tabIndex={-1}
      className="grid gap-5 rounded-action border-2 border-berry bg-berry-tint px-4 py-4 sm:px-6"
    >
      <h2 id="settle-title">
        {allergies.length > 0 ? 'Allergies at the table' : stopsTitle(open.length > 0)}
      </h2>
      <div
        className={classNames(
          'grid items-start gap-x-10 gap-y-5',
          allergies.length > 0 && stops && 'lg:grid-cols-2',
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
        {stops && (
          <div className="grid gap-5">
            {open.length > 0 && (
              <div className="grid gap-3">
                {allergies.length > 0 && <h3>{stopsTitle(true)}</h3>}
                <OpenStops order={order} studio={menu.studio} />
              </div>
            )}
            {lifted.length > 0 && (
              <div className="grid gap-3">
                {(allergies.length > 0 || open.length > 0) && <h3>{stopsTitle(false)}</h3>}
                <LiftedStops lifted={lifted} studio={menu.studio} />
              </div>
            )}
          </div>
        )}
      </div>
      {about.length > 0 && (
        <ul className="grid gap-3">
          {byGravity(about).map((it) => (
            <li key={`${it.code} ${it.about}`}>
              <AdviceNote advice={plainly(it)} />
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

const stopsTitle = (open: boolean): string =>
  open ? 'Settle this before you confirm' : 'Taken against a stop';
