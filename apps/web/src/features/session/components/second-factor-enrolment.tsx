import { useQueryClient } from '@tanstack/react-query';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { sessionQuery } from '../api/get-session.ts';
import { useConfirmSecondFactor } from '../api/confirm-second-factor.ts';
import { useEnrolSecondFactor } from '../api/enrol-second-factor.ts';
import { CodeForm } from './code-form.tsx';

type Props = { readonly onStart: () => void; readonly onDone: () => void };

/** Sets up the second factor: scan, prove it by a code, keep the recovery codes. */
export function SecondFactorEnrolment({ onStart, onDone }: Props) {
  const client = useQueryClient();
  const enrol = useEnrolSecondFactor();
  const confirm = useConfirmSecondFactor();

  if (confirm.isSuccess) {
    return (
      <div className="grid gap-5">
        <Notice tone="leaf" title="Your second factor is set up" live="polite">
          <p>
            Keep these recovery codes where you will find them without your phone. Each works once;
            they are shown only now.
          </p>
        </Notice>
        <ul className="grid grid-cols-2 gap-x-8 gap-y-2 font-mono text-lg tabular-nums sm:w-fit">
          {confirm.data.codes.map((code) => (
            <li key={code}>{code}</li>
          ))}
        </ul>
        <div>
          <Button
            onClick={() => {
              void client.invalidateQueries({ queryKey: sessionQuery().queryKey }).then(onDone);
            }}
          >
            I have kept them
          </Button>
        </div>
      </div>
    );
  }

  if (!enrol.isSuccess) {
    return (
      <div className="grid gap-5">
        <p className="measure">
          With a second factor, your password alone opens nothing. You need an authenticator on your
          phone that shows codes of six figures.
        </p>
        {enrol.isError && <Failure error={enrol.error} />}
        <div>
          <Button
            pending={enrol.isPending}
            onClick={() => {
              onStart();
              enrol.mutate();
            }}
          >
            Set it up now
          </Button>
        </div>
      </div>
    );
  }

  const { secret, qrSvg } = enrol.data;
  return (
    <div className="grid gap-6">
      <div className="grid gap-3">
        <h2>Scan this with your authenticator</h2>
        <img
          src={`data:image/svg+xml,${encodeURIComponent(qrSvg)}`}
          alt="A square code that holds the secret written below."
          className="size-52"
        />
        <p>
          Or type the secret: <strong className="font-mono break-all">{secret}</strong>
        </p>
      </div>
      <CodeForm
        label="The code it shows now"
        hint="Six figures; a new one comes every half minute."
        action="Confirm"
        pending={confirm.isPending}
        onCode={(code) => confirm.mutateAsync(code)}
      />
    </div>
  );
}
