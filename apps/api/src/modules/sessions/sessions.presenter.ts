import type { OwnSessions } from '#shared/contracts/accounts.ts';
import type { Session } from '#api/db/models/session.ts';

/** One's own sessions; their ids are hashes and open nothing. */
export function presentSessions(sessions: readonly Session[], currentRowId: string): OwnSessions {
  return {
    sessions: sessions.map((session) => ({
      id: session.sid,
      current: session.sid === currentRowId,
      agent: session.agent,
      createdAt: session.createdAt.toISOString(),
      lastSeenAt: session.lastSeenAt.toISOString(),
    })),
  };
}
