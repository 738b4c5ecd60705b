import { useEffect, useState } from 'react';
import type { ListOrdersQuery, OrderList } from '#shared/contracts/staff.ts';
import { orderStatuses } from '#shared/contracts/vocabulary.ts';
import { statusWord } from '#web/components/order/status-mark.tsx';
import { ChipChoices } from '#web/components/ui/chips.tsx';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';

type Props = {
  readonly query: ListOrdersQuery;
  readonly counts: OrderList['counts'] | undefined;
  readonly onQuery: (query: ListOrdersQuery) => void;
};

/** Typing rests this long before the list is asked for. */
const restMs = 300;

/** What narrows the list; every change is in the address at once. */
export function OrdersFilter({ query, counts, onQuery }: Props) {
  const shown = orderStatuses.filter(
    (it) => counts === undefined || (counts[it] ?? 0) > 0 || query.status?.includes(it),
  );
  return (
    <form role="search" className="grid gap-4" onSubmit={(event) => event.preventDefault()}>
      <div className="flex flex-wrap items-end gap-x-5 gap-y-3">
        <FindField
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

type FindProps = { readonly find: string; readonly onFind: (find: string) => void };

/** Finds by number, name, address or words; waits until typing rests. */
function FindField({ find, onFind }: FindProps) {
  const [text, setText] = useState(find);
  const [seen, setSeen] = useState({ find, sent: find });
  if (find !== seen.find) {
    setSeen({ ...seen, find });
    // Another view was chosen; what we sent ourselves must not overwrite what is typed since.
    if (find !== seen.sent) setText(find);
  }
  useEffect(() => {
    const wanted = text.trim();
    if (wanted === find) return undefined;
    const timer = setTimeout(() => {
      setSeen((now) => ({ ...now, sent: wanted }));
      onFind(wanted);
    }, restMs);
    return () => clearTimeout(timer);
  }, [text, find, onFind]);
  return (
    <div className="min-w-0 grow basis-64">
      <TextField
        type="search"
        label="Find"
        hint="A number, a name, an e-mail address."
        autoComplete="off"
        maxLength={100}
        value={text}
        onChange={(event) => setText(event.target.value)}
      />
    </div>
  );
}
