import type { SendAttempt } from '../draft/draft-record.ts';

/**
 * The attempt to send this body under. While an earlier try's end is unknown its key is kept, even
 * if answers changed since: the server then tells a body it has not seen under a key that already
 * made an order apart (`key-reused`), and one press can never become two orders.
 */
export function attemptFor(
  body: string,
  last: SendAttempt | null,
  newKey: () => string,
): SendAttempt {
  if (last === null) return { key: newKey(), bodies: [body] };
  const bodies = last.bodies.includes(body) ? last.bodies : [...last.bodies, body];
  return { key: last.key, bodies };
}

/** The bodies that may be the one that arrived, when the server says the key was used for another. */
export function earlierBodies(attempt: SendAttempt, body: string): readonly string[] {
  return attempt.bodies.filter((it) => it !== body);
}
