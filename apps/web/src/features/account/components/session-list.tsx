import { useQuery } from '@tanstack/react-query';
import { instantWords } from '#web/components/order/order-times.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { VisuallyHidden } from '#web/components/ui/visually-hidden.tsx';
import { useEndSession } from '../api/end-session.ts';
import { agentWords } from '../agent-words.ts';
import { sessionsQuery } from '../api/list-sessions.ts';

/** Where one is signed in, each place with a way to sign it out. */
export function SessionList({ locale }: { readonly locale: string }) {
  const { data, isPending, error, refetch } = useQuery(sessionsQuery());
  const end = useEndSession();
  if (isPending) return <Pending what="Looking where you are signed in…" />;
  if (error) return <Failure error={error} onRetry={() => void refetch()} />;
  // The reader's own clock: these are moments of theirs, not the studio's.
  const { timeZone } = Intl.DateTimeFormat().resolvedOptions();
  const when = (instant: string) => instantWords(instant, timeZone, locale);
  return (
    <div className="grid gap-3">
      {end.isError && <Failure error={end.error} />}
      <ul className="divide-y divide-seam border-y border-seam">
        {data.sessions.map((it) => (
          <li
            key={it.id}
            className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 py-3"
          >
            <div>
              <p className="font-semibold">
                {agentWords(it.agent)}
                {it.current && <span className="font-normal text-slate"> (this one)</span>}
              </p>
              <p className="text-sm text-slate tabular-nums">
                since {when(it.createdAt)}, last used {when(it.lastSeenAt)}
              </p>
            </div>
            {!it.current && (
              <Button
                kind="secondary"
                pending={end.isPending && end.variables === it.id}
                onClick={() => end.mutate(it.id)}
              >
                Sign out
                <VisuallyHidden> {agentWords(it.agent)}</VisuallyHidden>
              </Button>
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}
