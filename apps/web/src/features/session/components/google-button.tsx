import { useSession } from '../api/get-session.ts';
import { LinkButton } from '#web/components/ui/link-button.tsx';

/** Signing in with a Google account, where the studio has set that up. */
export function GoogleButton({
  next,
  link = false,
}: {
  readonly next: string;
  readonly link?: boolean;
}) {
  const offered = useSession().data?.googleSignIn ?? false;
  if (!offered) return null;
  const search = new URLSearchParams({ next, ...(link ? { link: 'true' } : {}) });
  return (
    <LinkButton to={`/api/auth/google?${search}`} kind="secondary" external>
      {link ? 'Add my Google account' : 'Go on with Google'}
    </LinkButton>
  );
}
