import { useEffect, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '#web/components/ui/button.tsx';
import { Dialog } from '#web/components/ui/dialog.tsx';

type Props = {
  /** Something is written that is not saved. */
  readonly unsaved: boolean;
  /** Whether the device keeps it meanwhile. */
  readonly kept: boolean;
};

/**
 * Asks before a link takes the baker away from what is not saved, and has the browser ask before
 * the tab closes. Going back by the browser's own button is not asked: the device keeps the draft.
 */
export function LeaveGuard({ unsaved, kept }: Props) {
  const navigate = useNavigate();
  const [to, setTo] = useState<string | null>(null);

  useEffect(() => {
    if (!unsaved) return undefined;
    const onUnload = (event: BeforeUnloadEvent) => event.preventDefault();
    const onClick = (event: MouseEvent) => {
      if (event.defaultPrevented || event.button !== 0) return;
      if (event.metaKey || event.ctrlKey || event.shiftKey || event.altKey) return;
      const link = event.target instanceof Element ? event.target.closest('a[href]') : null;
      if (!(link instanceof HTMLAnchorElement) || link.target !== '' || link.download !== '')
        return;
      const url = new URL(link.href);
      const here = window.location;
      if (url.origin !== here.origin || url.pathname === here.pathname) return;
      event.preventDefault();
      event.stopPropagation();
      setTo(url.pathname + url.search + url.hash);
    };
    window.addEventListener('beforeunload', onUnload);
    document.addEventListener('click', onClick, { capture: true });
    return () => {
      window.removeEventListener('beforeunload', onUnload);
      document.removeEventListener('click', onClick, { capture: true });
    };
  }, [unsaved]);

  return (
    <Dialog open={to !== null} onClose={() => setTo(null)} title="Leave without saving?">
      <p>
        {kept
          ? 'What you wrote stays on this device and is offered when you come back.'
          : 'This device does not keep what you wrote: leaving loses it.'}
      </p>
      <div className="flex flex-wrap gap-3">
        <Button
          kind={kept ? 'primary' : 'danger'}
          onClick={() => {
            if (to !== null) void navigate(to);
          }}
        >
          Leave
        </Button>
        <Button kind="secondary" onClick={() => setTo(null)}>
          Stay here
        </Button>
      </div>
    </Dialog>
  );
}
