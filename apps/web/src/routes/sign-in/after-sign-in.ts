import type { SessionView } from '#shared/contracts/accounts.ts';
import { paths, safeNext } from '#web/config/paths.ts';

/** Where somebody goes once signed in: to their second factor first, then to where they were going. */
export function afterSignIn({ user }: SessionView, next: string | null): string {
  if (user === null) return paths.signIn;
  if (user.secondFactor === 'needed' || user.secondFactor === 'to-enrol') {
    const search = next === null ? '' : `?next=${encodeURIComponent(next)}`;
    return paths.secondFactor + search;
  }
  return safeNext(next, user.role === 'customer' ? paths.account : paths.staffCalendar);
}
