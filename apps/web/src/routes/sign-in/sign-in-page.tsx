import { Link, useSearchParams } from 'react-router-dom';
import { LinkButton } from '#web/components/ui/link-button.tsx';
import { paths, safeNext } from '#web/config/paths.ts';
import { useSession } from '#web/features/session/api/get-session.ts';
import { GoogleButton } from '#web/features/session/components/google-button.tsx';
import { GoogleProblem } from '#web/features/session/components/google-problem.tsx';
import { LinkForm } from '#web/features/session/components/link-form.tsx';
import { NarrowPage } from './narrow-page.tsx';

/** Customers sign in: by a link in an e-mail or with Google. */
export function SignInPage() {
  const [search] = useSearchParams();
  const next = safeNext(search.get('next'), paths.account);
  const user = useSession().data?.user ?? null;
  return (
    <NarrowPage
      title="Sign in"
      lead="To see your orders in one place. You can order without an account: every order has a private link of its own."
      aside={
        <Link to={paths.staffSignIn} className="link inline-block py-2">
          I work at the studio
        </Link>
      }
    >
      <GoogleProblem problem={search.get('problem')} />
      {user !== null && (
        <div className="grid justify-items-start gap-3">
          <p>
            You are signed in as <strong>{user.email}</strong>.
          </p>
          <LinkButton
            to={user.role === 'customer' ? paths.account : paths.staffCalendar}
            kind="secondary"
          >
            Go on
          </LinkButton>
        </div>
      )}
      {user === null && (
        <>
          <LinkForm next={next} />
          <GoogleButton next={next} />
        </>
      )}
    </NarrowPage>
  );
}
