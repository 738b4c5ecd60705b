import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { paths } from '#web/config/paths.ts';
import { ChangePasswordForm } from '#web/features/account/components/change-password-form.tsx';
import { SessionList } from '#web/features/account/components/session-list.tsx';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { useSession } from '#web/features/session/api/get-session.ts';
import { useRemoveSecondFactor } from '#web/features/session/api/remove-second-factor.ts';
import { useSignOut } from '#web/features/session/api/sign-out.ts';
import { CodeForm } from '#web/features/session/components/code-form.tsx';
import { SecondFactorEnrolment } from '#web/features/session/components/second-factor-enrolment.tsx';

/** `/staff/me`: one's own way in: password, second factor, where one is signed in. */
export function MePage() {
  const { locale } = useMenu().studio;
  const user = useSession().data?.user ?? null;
  const signOut = useSignOut();
  const navigate = useNavigate();
  return (
    <div className="page py-6">
      <div className="grid max-w-3xl gap-8">
        <div className="grid gap-2">
          <PageTitle title={user?.name ?? 'Your own sign-in'} />
          {user !== null && (
            <p className="text-slate">
              {user.role}, {user.email}
            </p>
          )}
          {signOut.isError && <Failure error={signOut.error} />}
          <div>
            <Button
              kind="secondary"
              pending={signOut.isPending}
              onClick={() =>
                signOut.mutate(undefined, { onSuccess: () => void navigate(paths.staffSignIn) })
              }
            >
              Sign out
            </Button>
          </div>
        </div>
        <Section title="Second factor">
          <Rim>
            <OwnSecondFactor set={user?.secondFactor === 'done'} />
          </Rim>
        </Section>
        <Section title="Where you are signed in">
          <SessionList locale={locale} />
        </Section>
        <Section title="Password">
          <ChangePasswordForm />
        </Section>
      </div>
    </div>
  );
}

/** Sets up, replaces or takes off the second factor. */
function OwnSecondFactor({ set }: { readonly set: boolean }) {
  const [doing, setDoing] = useState<'nothing' | 'replace' | 'remove'>('nothing');
  // The recovery codes must stay on screen although the session has its second factor by then.
  const [enrolling, setEnrolling] = useState(false);
  const remove = useRemoveSecondFactor();
  const toast = useToast();

  if (doing === 'remove') {
    return (
      <div className="grid gap-4">
        <CodeForm
          label="A code of it, to take it off"
          hint="Six figures from your authenticator, or one of your recovery codes."
          action="Take it off"
          pending={remove.isPending}
          onCode={async (code) => {
            await remove.mutateAsync(code);
            setDoing('nothing');
            toast({ message: 'Your second factor is off; your password alone opens the studio.' });
          }}
        />
        <div>
          <Button kind="quiet" onClick={() => setDoing('nothing')}>
            Leave it on
          </Button>
        </div>
      </div>
    );
  }
  if (!set || enrolling || doing === 'replace') {
    return (
      <SecondFactorEnrolment
        onStart={() => setEnrolling(true)}
        onDone={() => {
          setEnrolling(false);
          setDoing('nothing');
        }}
      />
    );
  }
  return (
    <div className="grid gap-4">
      <p>It is set up: your password alone opens nothing.</p>
      <div className="flex flex-wrap gap-3">
        <Button kind="secondary" onClick={() => setDoing('replace')}>
          Set up another one
        </Button>
        <Button kind="quiet" onClick={() => setDoing('remove')}>
          Take it off
        </Button>
      </div>
    </div>
  );
}
