import type { Message } from '#shared/contracts/orders.ts';
import { instantWords } from './order-times.ts';

type Props = {
  readonly messages: readonly Message[];
  /** How the writer is named to the reader. */
  readonly nameOf: (message: Message) => string;
  readonly zone: string;
  readonly locale: string;
};

/** What has been written both ways, oldest first. */
export function MessagesList({ messages, nameOf, zone, locale }: Props) {
  if (messages.length === 0) return <p className="text-slate">Nothing has been written yet.</p>;
  return (
    <ol className="grid divide-y divide-seam">
      {messages.map((it) => (
        <li key={it.id} className="grid gap-1 py-3">
          <p className="flex flex-wrap items-baseline justify-between gap-x-4">
            <strong>{nameOf(it)}</strong>
            <time dateTime={it.at} className="text-sm text-slate tabular-nums">
              {instantWords(it.at, zone, locale)}
            </time>
          </p>
          <p className="measure whitespace-pre-line">{it.body}</p>
        </li>
      ))}
    </ol>
  );
}
