import { useQuery } from '@tanstack/react-query';
import { useEffect } from 'react';
import { useLocation, useNavigate, useParams } from 'react-router-dom';
import type { StudioCard } from '#shared/contracts/menu.ts';
import { EmptyState } from '#web/components/ui/empty-state.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { paths } from '#web/config/paths.ts';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { orderQuery } from '#web/features/my-order/api/get-order.ts';
import { privateLinkQuery } from '#web/features/my-order/api/open-private-link.ts';
import { ApiProblem } from '#web/lib/http.ts';
import { OrderSheet } from './order-sheet.tsx';

/** One order, for whoever holds its private link or the account it belongs to. */
export function MyOrderPage() {
  const { code = '' } = useParams();
  const { hash } = useLocation();
  const navigate = useNavigate();
  const menu = useMenu();
  const key = new URLSearchParams(hash.slice(1)).get('key') ?? '';
  const link = useQuery({ ...privateLinkQuery(code, key), enabled: key !== '' });
  const opening = key !== '' && link.isPending;
  const order = useQuery({ ...orderQuery(code), enabled: !opening });

  useEffect(() => {
    // The key has done its work; an address without it can be shown to others.
    if (link.isSuccess) void navigate(paths.myOrder(code), { replace: true });
  }, [link.isSuccess, navigate, code]);

  if (order.data) return <OrderSheet order={order.data} menu={menu} />;
  if (opening || order.isPending) {
    return (
      <div className="page py-8">
        <PageTitle title="Your order" />
        <Pending what="Opening your order…" />
      </div>
    );
  }
  const closed = order.error instanceof ApiProblem && [401, 403, 404].includes(order.error.status);
  return (
    <div className="page grid gap-6 py-8">
      <PageTitle title="Your order" />
      {closed ? (
        <NotOpenHere code={code} studio={menu.studio} />
      ) : (
        <Failure error={order.error} onRetry={() => void order.refetch()} />
      )}
    </div>
  );
}

type NotOpenProps = { readonly code: string; readonly studio: StudioCard };

function NotOpenHere({ code, studio }: NotOpenProps) {
  return (
    <EmptyState
      title="We cannot open it for you here"
      action={<LinkButton to={paths.signInThen(paths.myOrder(code))}>Sign in</LinkButton>}
    >
      <p>
        Open it with the link in our e-mail, or sign in with the address you ordered with. Neither
        works? Write to{' '}
        <a href={`mailto:${studio.email}`} className="link">
          {studio.email}
        </a>
        .
      </p>
    </EmptyState>
  );
}
