import type { StudioCard } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { AdviceNote } from '#web/components/order/advice-note.tsx';
import { instantWords } from '#web/components/order/order-times.ts';

type Props = { readonly lifted: StaffOrder['lifted']; readonly studio: StudioCard };

/** Stops the owner takes the order against, each with its reason and whether it was accepted. */
export function LiftedStops({ lifted, studio }: Props) {
  const when = (at: string) => instantWords(at, studio.zone, studio.locale);
  return (
    <ul className="grid gap-4">
      {lifted.map((it) => (
        <li key={it.id} className="grid gap-1">
          <AdviceNote advice={{ level: 'stop', sentence: it.plain, instead: '' }} />
          <p className="ml-6.5">
            <strong>Taken all the same:</strong> {it.reason}{' '}
            <span className="text-sm text-slate">
              ({it.by}, {when(it.at)})
            </span>
          </p>
          <p className="ml-6.5 text-sm">
            {it.acceptedAt === null
              ? 'The customer has not read and accepted it yet. Until then it cannot be confirmed.'
              : `The customer read and accepted it, ${when(it.acceptedAt)}.`}
          </p>
        </li>
      ))}
    </ul>
  );
}
