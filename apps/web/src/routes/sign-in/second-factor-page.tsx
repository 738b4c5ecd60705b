import { useState } from 'react';
import { Navigate, useNavigate, useSearchParams } from 'react-router-dom';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { paths, safeNext } from '#web/config/paths.ts';
import { useSession } from '#web/features/session/api/get-session.ts';
import { usePassSecondFactor } from '#web/features/session/api/pass-second-factor.ts';
import { CodeForm } from '#web/features/session/components/code-form.tsx';
import { SecondFactorEnrolment } from '#web/features/session/components/second-factor-enrolment.tsx';
import { NarrowPage } from './narrow-page.tsx';

/** Staff give their second factor, or set one up. */
export function SecondFactorPage() {
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const { data, isPending, error, refetch } = useSession();
  const pass = usePassSecondFactor();
  // Enrolling makes the session `done`; the recovery codes must stay on screen all the same.
  const [enrolling, setEnrolling] = useState(false);
  const goOn = () =>
    void navigate(safeNext(search.get('next'), paths.staffCalendar), { replace: true });

  if (isPending) {
    return (
      <NarrowPage title="Second factor">
        <Pending what="One moment…" />
      </NarrowPage>
    );
  }
  if (error) {
    return (
      <NarrowPage title="Second factor">
        <Failure error={error} onRetry={() => void refetch()} />
      </NarrowPage>
    );
  }
  const need = data.user?.secondFactor ?? null;
  if (need === null) return <Navigate to={paths.staffSignIn} replace />;
  if (need === 'needed') {
    return (
      <NarrowPage title="Your second factor">
        <CodeForm
          label="Code"
          hint="Six figures from your authenticator, or one of your recovery codes."
          action="Go on"
          pending={pass.isPending}
          onCode={async (code) => {
            await pass.mutateAsync(code);
            goOn();
          }}
        />
      </NarrowPage>
    );
  }
  if (need === 'done' && !enrolling) {
    return (
      <NarrowPage title="Second factor">
        <Notice tone="leaf" title="Your second factor is set up" />
      </NarrowPage>
    );
  }
  return (
    <NarrowPage
      title="Set up a second factor"
      lead={need === 'to-enrol' ? 'The studio asks everybody who works here for one.' : undefined}
    >
      <SecondFactorEnrolment onStart={() => setEnrolling(true)} onDone={goOn} />
    </NarrowPage>
  );
}
