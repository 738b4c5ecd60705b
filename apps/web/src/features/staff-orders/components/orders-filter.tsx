import type { ListOrdersQuery, OrderList } from '#shared/contracts/staff.ts';
import { orderStatuses } from '#shared/contracts/vocabulary.ts';
import { statusWord } from '#web/components/order/status-mark.tsx';
import { ChipChoices } from '#web/components/ui/chips.tsx';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { FindField } from '#web/components/ui/find-field.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';

type Props = {
  readonly query: ListOrdersQuery;
  readonly counts: OrderList['counts'] | undefined;
  readonly onQuery: (query: ListOrdersQuery) => void;
};

/** What narrows the list; every change is in the address at once. */
export function OrdersFilter({ query, counts, onQuery }: Props) {
  const shown = orderStatuses.filter(
    (it) => counts === undefined || (counts[it] ?? 0) > 0 || query.status?.includes(it),
  );
  return (
    <form role="search" className="grid gap-4" onSubmit={(event) => event.preventDefault()}>
      <div className="flex flex-wrap items-end gap-x-5 gap-y-3">
        <FindField
          hint="A number, a name, an e-mail address."
          find={query.find ?? ''}
          onFind={(find) =>
            onQuery({ ...query, find: find === '' ? undefined : find, page: undefined })
          }
        />
        <TextField
          type="date"
          label="Pickup from"
          value={query.from ?? ''}
          onChange={(event) => onQuery({ ...query, from: dateOf(event), page: undefined })}
        />
        <TextField
          type="date"
          label="to"
          value={query.to ?? ''}
          onChange={(event) => onQuery({ ...query, to: dateOf(event), page: undefined })}
        />
        <Checkbox
          label="With allergies only"
          checked={query.allergies === true}
          onChange={(event) =>
            onQuery({
              ...query,
              allergies: event.target.checked ? true : undefined,
              page: undefined,
            })
          }
        />
      </div>
      {shown.length > 0 && (
        <ChipChoices
          legend={<span className="sr-only">Status</span>}
          value={query.status ?? []}
          onValue={(status) =>
            onQuery({ ...query, status: status.length === 0 ? undefined : status, page: undefined })
          }
          chips={shown.map((value) => ({
            value,
            label: (
              <>
                {statusWord[value]}{' '}
                <span className="font-normal text-slate">{counts?.[value] ?? 0}</span>
              </>
            ),
          }))}
        />
      )}
    </form>
  );
}

function dateOf(event: { readonly target: { readonly value: string } }): string | undefined {
  return event.target.value === '' ? undefined : event.target.value;
}
