import { useRef, useState } from 'react';
import type { LiftedStop, OrderView } from '#shared/contracts/orders.ts';
import type { StudioCard } from '#shared/contracts/menu.ts';
import { instantWords } from '#web/components/order/order-times.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { ToneGlyph } from '#web/components/ui/notice.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { useAcceptLiftedStop } from '../api/accept-lifted-stop.ts';

type Props = { readonly order: OrderView; readonly studio: StudioCard };

/**
 * What the studio takes the order against, and why: the stop and the reason side by side, to be
 * read and accepted before anything is confirmed.
 */
export function LiftedStops({ order, studio }: Props) {
  const waiting = order.can.acceptLifted;
  return (
    <section
      aria-labelledby="lifted-title"
      className="grid gap-5 rounded-action border-2 border-berry bg-berry-tint px-4 py-4 sm:px-6"
    >
      <div className="grid gap-1">
        <h2 id="lifted-title">
          {waiting ? 'Please read this before we confirm' : 'What you read and accepted'}
        </h2>
        {waiting && (
          <p className="measure">
            What is in the cake has not changed. {studio.name} takes your order all the same, for
            the reason below. If it is not what you talked about, do not accept it: write to us here
            or ring {studio.phone}.
          </p>
        )}
      </div>
      <ul className="grid gap-6">
        {order.lifted.map((it) => (
          <Lifted key={it.id} order={order} studio={studio} lifted={it} />
        ))}
      </ul>
    </section>
  );
}

function Lifted({ order, studio, lifted }: Props & { readonly lifted: LiftedStop }) {
  const when = (at: string) => instantWords(at, order.pickup.zone, studio.locale);
  return (
    <li className="grid gap-3">
      <p className="flex gap-2.5 font-semibold text-berry">
        <ToneGlyph tone="berry" className="mt-0.5" />
        {lifted.sentence}
      </p>
      <blockquote className="grid gap-1 border-l-3 border-berry pl-4">
        <p className="measure whitespace-pre-line">{lifted.reason}</p>
        <footer className="text-sm text-slate">
          {lifted.by}, {when(lifted.at)}
        </footer>
      </blockquote>
      {lifted.acceptedAt !== null ? (
        <p className="text-sm">You read and accepted it, {when(lifted.acceptedAt)}.</p>
      ) : (
        order.can.acceptLifted && <Accept order={order} lifted={lifted} />
      )}
    </li>
  );
}

function Accept({ order, lifted }: { readonly order: OrderView; readonly lifted: LiftedStop }) {
  const [read, setRead] = useState(false);
  const [missing, setMissing] = useState(false);
  const box = useRef<HTMLInputElement>(null);
  const accept = useAcceptLiftedStop(order.code);
  const toast = useToast();
  return (
    <div className="grid gap-3">
      {accept.isError && <Failure error={accept.error} />}
      <Checkbox
        ref={box}
        label="I have read what is in the cake and why you take the order"
        checked={read}
        error={missing && !read ? 'Tick this once you have read both.' : undefined}
        onChange={(event) => setRead(event.target.checked)}
      />
      <div>
        <Button
          pending={accept.isPending}
          onClick={() => {
            if (!read) {
              setMissing(true);
              box.current?.focus();
              return;
            }
            accept.mutate(
              { rowVersion: order.rowVersion, liftedStopId: lifted.id },
              {
                onSuccess: () =>
                  toast({ message: 'Thank you. The baker can confirm your order now.' }),
              },
            );
          }}
        >
          I accept this
        </Button>
      </div>
    </div>
  );
}
