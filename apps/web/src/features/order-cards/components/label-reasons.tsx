import { Link } from 'react-router-dom';
import type { OrderLabels } from '#shared/contracts/cards.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { describeFailure } from '#web/lib/describe-failure.ts';
import { useConfirmUnknown } from '../api/confirm-unknown.ts';

type Props = {
  readonly number: number;
  readonly labels: OrderLabels;
  readonly ingredientPath: ((id: string) => string) | null;
};

/** Why nothing can be printed yet, where to put it right, and the owner's word on what is unknown. */
export function LabelReasons({ number, labels, ingredientPath }: Props) {
  const confirm = useConfirmUnknown(number);
  const failure = confirm.isError ? describeFailure(confirm.error) : null;
  const { reasons, unknownConfirmed, can } = labels;
  const open = reasons.filter((it) => it.confirmable).map((it) => it.sentence);
  if (reasons.length === 0) {
    if (!unknownConfirmed) return null;
    return (
      <Notice tone="butter" title="Printed as not known">
        <p>The owner has answered for what is not known about this cake. The label says so.</p>
      </Notice>
    );
  }
  const early = reasons.every((it) => it.code === 'not-confirmed');
  return (
    <Notice
      tone={early ? 'plain' : 'berry'}
      title={early ? 'Once it is confirmed' : 'No label can be printed yet'}
    >
      <ul className="grid gap-2">
        {reasons.map((it) => (
          <li key={`${it.code} ${it.sentence}`}>
            {it.sentence}{' '}
            {it.ingredientId !== null && ingredientPath !== null && (
              <Link to={ingredientPath(it.ingredientId)} className="link">
                Open it in the pantry
              </Link>
            )}
          </li>
        ))}
      </ul>
      {can.confirmUnknown && open.length > 0 && (
        <div className="grid gap-2">
          <p>
            Or answer for it yourself: the label then says “not known” in plain words. Something
            else unknown stops it again.
          </p>
          <div>
            <Button kind="danger" pending={confirm.isPending} onClick={() => confirm.mutate(open)}>
              Print it as not known
            </Button>
          </div>
        </div>
      )}
      {!can.confirmUnknown && open.length > 0 && (
        <p>Only the owner may let it be printed as not known.</p>
      )}
      {failure !== null && (
        <p role="alert">
          {failure.title}. {failure.detail}
        </p>
      )}
    </Notice>
  );
}
