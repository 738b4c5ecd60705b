import { Link } from 'react-router-dom';
import { paths } from '#web/config/paths.ts';
import { ForgottenPasswordForm } from '#web/features/session/components/forgotten-password-form.tsx';
import { NarrowPage } from './narrow-page.tsx';

export function ForgottenPasswordPage() {
  return (
    <NarrowPage
      title="A new password"
      lead="For the studio’s people. Customers have no password: they sign in by a link."
      aside={
        <Link to={paths.staffSignIn} className="link inline-block py-2">
          Back to signing in
        </Link>
      }
    >
      <ForgottenPasswordForm />
    </NarrowPage>
  );
}
