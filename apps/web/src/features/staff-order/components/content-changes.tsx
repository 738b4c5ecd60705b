import type { StaffContentChange } from '#shared/contracts/contents.ts';
import type { StudioCard } from '#shared/contracts/menu.ts';
import type { StaffOrder } from '#shared/contracts/staff.ts';
import { instantWords } from '#web/components/order/order-times.ts';
import { Notice } from '#web/components/ui/notice.tsx';
import { AcknowledgeContents, TellContents } from './contents-forms.tsx';

type Props = { readonly order: StaffOrder; readonly studio: StudioCard };

/**
 * What is in the cake now and was not when it was ordered, by a label or a formula that changed.
 * It is neither marked ready nor handed over before its customer knows.
 */
export function ContentChanges({ order, studio }: Props) {
  if (order.contentChanges.length === 0) return null;
  return (
    <section aria-labelledby="changed-title" className="grid gap-3">
      <h2 id="changed-title" className="text-lg">
        What is in it has changed
      </h2>
      {order.contentChanges.toReversed().map((change) => (
        <Change key={change.id} order={order} change={change} studio={studio} />
      ))}
    </section>
  );
}

type ChangeProps = Props & { readonly change: StaffContentChange };

function Change({ order, change, studio }: ChangeProps) {
  const { changes, clashes, acknowledged, told, cause, by, at } = change;
  const when = (instant: string) => instantWords(instant, studio.zone, studio.locale);
  const isOpen = told === null || (clashes.length > 0 && acknowledged === null);
  return (
    <Notice
      tone={!isOpen ? 'leaf' : clashes.length > 0 ? 'berry' : 'butter'}
      title={`${cause}, changed by ${by}, ${when(at)}`}
    >
      <ul className="grid gap-1">
        {changes.map((each) => (
          <li key={each}>{each}</li>
        ))}
      </ul>
      {clashes.length > 0 && (
        <div>
          <p className="font-semibold">Against what guests told:</p>
          <ul className="grid gap-1">
            {clashes.map((each) => (
              <li key={each}>{each}</li>
            ))}
          </ul>
        </div>
      )}
      {told !== null ? (
        <p>
          <strong>The customer knows.</strong> {told.how}
          <span className="text-sm text-slate">
            {' '}
            ({told.by === '' ? when(told.at) : `${told.by}, ${when(told.at)}`})
          </span>
        </p>
      ) : (
        <>
          <p>
            <strong>The customer does not know yet:</strong> until then it is neither marked ready
            nor handed over. {mailWords(change, when)}
          </p>
          {order.can.tellContents && <TellContents order={order} change={change} />}
        </>
      )}
      {acknowledged !== null ? (
        <p>
          <strong>Seen to.</strong> {acknowledged.note}
          <span className="text-sm text-slate">
            {' '}
            ({acknowledged.by}, {when(acknowledged.at)})
          </span>
        </p>
      ) : order.can.acknowledgeContents ? (
        <AcknowledgeContents order={order} change={change} />
      ) : (
        <p className="text-sm">No baker has seen to it yet.</p>
      )}
    </Notice>
  );
}

function mailWords(
  { mailAt, mailLate }: StaffContentChange,
  when: (instant: string) => string,
): string {
  if (mailAt === null) return 'There is no e-mail address, so tell them yourselves.';
  if (mailLate) return 'Our e-mail has not arrived (see E-mails below), so tell them yourselves.';
  return `Our e-mail goes out ${when(mailAt)}, unless it is put right in the pantry first.`;
}
