import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useLocation, useNavigate } from 'react-router-dom';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { paths } from '#web/config/paths.ts';
import { lookAtLinkQuery } from '#web/features/session/api/look-at-link.ts';
import { useSpendLink } from '#web/features/session/api/spend-link.ts';
import { NewAccountForm } from '#web/features/session/components/new-account-form.tsx';
import { NewPasswordForm } from '#web/features/session/components/new-password-form.tsx';
import { ApiProblem } from '#web/lib/http.ts';
import { afterSignIn } from './after-sign-in.ts';
import { NarrowPage } from './narrow-page.tsx';

/**
 * Where the links of our e-mails lead. Opening the page spends nothing, since mail scanners open
 * links too; a button's press does.
 */
export function LinkPage() {
  const { hash } = useLocation();
  // Kept from the first look: going on replaces the address.
  const [token] = useState(() => decodeURIComponent(hash.slice(1)));
  const {
    data: link,
    isPending,
    error,
    refetch,
  } = useQuery({
    ...lookAtLinkQuery(token),
    enabled: token !== '',
  });

  if (token === '' || error) {
    return (
      <NarrowPage title="This link does not open anything" aside={<OtherWays />}>
        {error ? (
          <Failure error={error} onRetry={spent(error) ? undefined : () => void refetch()} />
        ) : (
          <Notice tone="berry" title="The address is not whole">
            <p>Copy it again from the e-mail, all of it, or press the button there.</p>
          </Notice>
        )}
      </NarrowPage>
    );
  }
  if (isPending) {
    return (
      <NarrowPage title="Your link">
        <Pending what="Looking at your link…" />
      </NarrowPage>
    );
  }
  switch (link.purpose) {
    case 'sign-in':
      return <SpendPage token={token} title="Sign in" email={link.email} action="Sign me in" />;
    case 'confirm-action':
      return (
        <SpendPage
          token={token}
          title="Confirm that it is you"
          email={link.email}
          action="Yes, go ahead"
        />
      );
    case 'invitation':
    case 'first-owner':
      return <InvitationPage token={token} {...link} />;
    case 'password-reset':
      return <ResetPage token={token} email={link.email} />;
  }
}

/** A link that has done its work will not do it again. */
function spent(error: unknown): boolean {
  return error instanceof ApiProblem && error.code === 'link-spent';
}

type SpendProps = {
  readonly token: string;
  readonly title: string;
  readonly email: string | null;
  readonly action: string;
};

function SpendPage({ token, title, email, action }: SpendProps) {
  const navigate = useNavigate();
  const spend = useSpendLink();
  if (spend.data?.purpose === 'confirm-action') {
    return (
      <NarrowPage title="Done">
        <Notice tone="leaf" title="What you asked for is done" live="polite">
          <p>
            <Link to={paths.home} className="link">
              To the first page
            </Link>
          </p>
        </Notice>
      </NarrowPage>
    );
  }
  return (
    <NarrowPage title={title} aside={spend.isError ? <OtherWays /> : undefined}>
      {email !== null && (
        <p>
          For <strong>{email}</strong>. The link works once.
        </p>
      )}
      {spend.isError && <Failure error={spend.error} />}
      <div>
        <Button
          pending={spend.isPending}
          onClick={() =>
            spend.mutate(
              { token },
              {
                onSuccess: (spent) => {
                  if (spent.purpose === 'sign-in') {
                    void navigate(afterSignIn(spent.session, spent.next), { replace: true });
                  }
                },
              },
            )
          }
        >
          {action}
        </Button>
      </div>
    </NarrowPage>
  );
}

type InvitationProps = {
  readonly token: string;
  readonly role: string | null;
  readonly email: string | null;
  readonly name: string | null;
};

function InvitationPage({ token, role, email, name }: InvitationProps) {
  const navigate = useNavigate();
  return (
    <NarrowPage
      title={email === null ? 'The first owner' : 'You are invited'}
      lead={
        email === null
          ? 'This link makes the account that runs the studio. It works once.'
          : `You join the studio as ${role ?? 'staff'}, with ${email}.`
      }
    >
      <NewAccountForm
        token={token}
        asksEmail={email === null}
        name={name ?? ''}
        onEntered={(session) => void navigate(afterSignIn(session, null), { replace: true })}
      />
    </NarrowPage>
  );
}

function ResetPage({ token, email }: { readonly token: string; readonly email: string | null }) {
  const [done, setDone] = useState(false);
  if (done) {
    return (
      <NarrowPage title="Your password is set">
        <Notice tone="leaf" title="Sign in with your new password" live="polite">
          <p>Every place you were signed in has been signed out.</p>
          <p>
            <Link to={paths.staffSignIn} className="link">
              To the studio sign-in
            </Link>
          </p>
        </Notice>
      </NarrowPage>
    );
  }
  return (
    <NarrowPage title="Set a new password" lead={email === null ? undefined : `For ${email}.`}>
      <NewPasswordForm token={token} onDone={() => setDone(true)} />
    </NarrowPage>
  );
}

function OtherWays() {
  return (
    <>
      <p>A link works once and for a short while. You can ask for a new one:</p>
      <Link to={paths.signIn} className="link inline-block py-2">
        A link to sign in
      </Link>
      <Link to={paths.forgottenPassword} className="link inline-block py-2">
        A new password, for the studio’s people
      </Link>
    </>
  );
}
