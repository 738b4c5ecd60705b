import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import { paths, safeNext } from '#web/config/paths.ts';
import { GoogleButton } from '#web/features/session/components/google-button.tsx';
import { GoogleProblem } from '#web/features/session/components/google-problem.tsx';
import { PasswordForm } from '#web/features/session/components/password-form.tsx';
import { afterSignIn } from './after-sign-in.ts';
import { NarrowPage } from './narrow-page.tsx';

/** The studio's people sign in by e-mail and password, or with a Google account they have added. */
export function StaffSignInPage() {
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const next = search.get('next');
  return (
    <NarrowPage
      title="Studio sign-in"
      aside={
        <>
          <Link to={paths.forgottenPassword} className="link inline-block py-2">
            I have forgotten my password
          </Link>
          <Link to={paths.signIn} className="link inline-block py-2">
            I am a customer
          </Link>
        </>
      }
    >
      <GoogleProblem problem={search.get('problem')} />
      <PasswordForm
        onEntered={(session) => void navigate(afterSignIn(session, next), { replace: true })}
      />
      <GoogleButton next={safeNext(next, paths.staffCalendar)} />
    </NarrowPage>
  );
}
