import type { ListOrdersQuery, OrderList } from '#shared/contracts/staff.ts';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { writeOrdersSearch } from '../search/orders-search.ts';

type Props = {
  readonly list: Pick<OrderList, 'page' | 'perPage' | 'total'>;
  readonly query: ListOrdersQuery;
};

/** Which part of the list this is, and the ways to the others. */
export function Pager({ list: { page, perPage, total }, query }: Props) {
  const pages = Math.max(1, Math.ceil(total / perPage));
  const from = Math.min(total, (page - 1) * perPage + 1);
  const to = Math.min(total, page * perPage);
  const at = (next: number) => `?${writeOrdersSearch({ ...query, page: next })}`;
  return (
    <nav aria-label="Pages" className="flex flex-wrap items-center gap-3">
      <p role="status" className="mr-auto text-slate tabular-nums">
        {total === 0 ? 'None' : `${from} to ${to} of ${total}`}
      </p>
      {page > 1 && (
        <LinkButton to={at(page - 1)} kind="secondary">
          Page before
        </LinkButton>
      )}
      {page < pages && (
        <LinkButton to={at(page + 1)} kind="secondary">
          Next page
        </LinkButton>
      )}
    </nav>
  );
}
