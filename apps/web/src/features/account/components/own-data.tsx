import { useState } from 'react';
import { Button } from '#web/components/ui/button.tsx';
import { Dialog } from '#web/components/ui/dialog.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { useRequestErasure } from '../api/request-erasure.ts';

/** Taking out what is kept, and asking for it to be erased. */
export function OwnData({ email }: { readonly email: string }) {
  const [asking, setAsking] = useState(false);
  const erase = useRequestErasure();
  return (
    <div className="grid gap-4">
      <p className="measure">
        You can take out everything we keep about you as a file, or have it erased: your name,
        addresses, messages, photos and what you told us about allergies. What an order cost stays
        in the books without your name.
      </p>
      {erase.isSuccess && (
        <Notice tone="leaf" title="One step more" live="polite">
          <p>
            We have sent a link to {email}. Nothing is erased until you press the button it leads
            to.
          </p>
        </Notice>
      )}
      <div className="flex flex-wrap gap-3">
        <LinkButton to="/api/account/export" kind="secondary" external>
          Take out my data
        </LinkButton>
        <Button kind="danger" onClick={() => setAsking(true)}>
          Erase my data
        </Button>
      </div>
      <Dialog open={asking} onClose={() => setAsking(false)} title="Erase everything about you?">
        <p>
          Your account closes and your past orders lose your name, messages and photos. This cannot
          be undone. Orders still to come must be collected or withdrawn first.
        </p>
        <p>To be sure it is you, we send a link to {email} first.</p>
        {erase.isError && <Failure error={erase.error} />}
        <div className="flex flex-wrap gap-3">
          <Button
            kind="danger"
            pending={erase.isPending}
            onClick={() => erase.mutate(undefined, { onSuccess: () => setAsking(false) })}
          >
            Send me the link
          </Button>
          <Button kind="secondary" onClick={() => setAsking(false)}>
            Keep my account
          </Button>
        </div>
      </Dialog>
    </div>
  );
}
