import { useState } from 'react';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { Button } from '#web/components/ui/button.tsx';
import { DataList } from '#web/components/ui/data-list.tsx';
import { Dialog } from '#web/components/ui/dialog.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { ActFailure } from '../actions/act-failure.tsx';
import { useRenewLink } from '../api/renew-link.ts';

const parts: Readonly<Record<StaffOrder['contacts'][number]['as'], string>> = {
  ordered: 'Ordered by',
  pays: 'Pays',
  collects: 'Collects',
};

const places: readonly StaffOrder['contacts'][number]['as'][] = ['ordered', 'pays', 'collects'];

const reach: Readonly<Record<string, string>> = {
  email: 'prefers e-mail',
  phone: 'prefers a call',
  text: 'prefers a text message',
};

/** Who they are and how to reach them; the private link. */
export function OrderContacts({ order }: { readonly order: StaffOrder }) {
  const [renewing, setRenewing] = useState(false);
  return (
    <div className="grid gap-3">
      <DataList
        rows={order.contacts
          .toSorted((a, b) => places.indexOf(a.as) - places.indexOf(b.as))
          .map((it) => ({
            key: it.as,
            label: parts[it.as],
            value: (
              <span className="grid justify-items-start">
                <strong>{it.name}</strong>
                {it.email !== '' && (
                  <a href={`mailto:${it.email}`} className="link inline-block py-0.5 break-all">
                    {it.email}
                  </a>
                )}
                {it.phone !== '' && (
                  <a
                    href={`tel:${it.phone.replaceAll(/[^+\d]/g, '')}`}
                    className="link inline-block py-0.5"
                  >
                    {it.phone}
                  </a>
                )}
                {it.as === 'ordered' && reach[it.reachBy] !== undefined && (
                  <span className="text-sm text-slate">{reach[it.reachBy]}</span>
                )}
              </span>
            ),
          }))}
      />
      <p className="text-sm text-slate">
        {order.showPhotos
          ? 'They allow photos of the cake to be shown.'
          : 'They have not allowed photos of the cake to be shown.'}
      </p>
      {order.can.renewLink && (
        <div data-print="no">
          <Button kind="secondary" onClick={() => setRenewing(true)}>
            Renew the private link
          </Button>
        </div>
      )}
      {renewing && <RenewLink order={order} onClose={() => setRenewing(false)} />}
    </div>
  );
}

function RenewLink({
  order,
  onClose,
}: {
  readonly order: StaffOrder;
  readonly onClose: () => void;
}) {
  const renew = useRenewLink(order.number);
  const toast = useToast();
  return (
    <Dialog open onClose={onClose} title="Renew the private link">
      <ActFailure error={renew.error} />
      <p>
        The customer gets a new link by e-mail. The old one, wherever it has been passed on to,
        opens nothing any more.
      </p>
      <div className="flex flex-wrap gap-3">
        <Button
          pending={renew.isPending}
          onClick={() =>
            renew.mutate(
              { rowVersion: order.rowVersion },
              {
                onSuccess: () => {
                  toast({ message: 'A new link is on its way; the old one is shut.' });
                  onClose();
                },
              },
            )
          }
        >
          Send a new link
        </Button>
        <Button kind="quiet" onClick={onClose}>
          Not yet
        </Button>
      </div>
    </Dialog>
  );
}
