import { Link } from 'react-router-dom';
import type { Menu } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { MailState } from '#web/components/order/mail-state.tsx';
import { instantWords } from '#web/components/order/order-times.ts';
import { paths } from '#web/config/paths.ts';

/** Every e-mail of this order, each to be read exactly as it went. */
export function OrderMail({ order, menu }: { readonly order: StaffOrder; readonly menu: Menu }) {
  const { zone, locale } = menu.studio;
  if (order.mail.length === 0) return <p className="text-slate">No e-mail has gone out yet.</p>;
  return (
    <ol className="divide-y divide-seam border-y border-seam">
      {order.mail.map((it) => (
        <li key={it.id} className="grid gap-0.5 py-2.5">
          <Link to={paths.staffMail(it.id)} className="link inline-block py-0.5">
            {it.subject}
          </Link>
          <p className="text-sm text-slate">
            to <span className="break-all">{it.to}</span>, {instantWords(it.at, zone, locale)}
          </p>
          <MailState state={it.state} lastError={it.lastError} />
        </li>
      ))}
    </ol>
  );
}
