import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { PageTitle } from '#web/components/ui/page-title.tsx';
import { Pending } from '#web/components/ui/pending.tsx';
import { Rim } from '#web/components/ui/rim.tsx';
import { Section } from '#web/components/ui/section.tsx';
import { useMenu } from '#web/features/menu/api/get-menu.ts';
import { usePeople } from '#web/features/people/api/get-people.ts';
import { InviteForm } from '#web/features/people/components/invite-form.tsx';
import { PeopleList } from '#web/features/people/components/people-list.tsx';
import { ApiProblem } from '#web/lib/http.ts';

/** `/staff/studio`: the people who work here. */
export function PeoplePage() {
  const { zone, locale } = useMenu().studio;
  const { data, error, isPending, refetch, isFetching } = usePeople();
  return (
    <div className="page grid gap-8 py-6">
      <PageTitle title="People" />
      {isPending ? (
        <Pending what="Fetching the people…" />
      ) : data === undefined ? (
        error instanceof ApiProblem && error.code === 'not-allowed' ? (
          <Notice title="People are the owner’s to look after">
            <p>Your own sign-in is under your name, at the top.</p>
          </Notice>
        ) : (
          <Failure error={error} onRetry={() => void refetch()} retrying={isFetching} />
        )
      ) : (
        <div className="grid items-start gap-x-10 gap-y-8 lg:grid-cols-[1fr_24rem]">
          <div className="grid gap-4">
            <Notice
              tone={data.requireSecondFactor ? 'plain' : 'butter'}
              title={
                data.requireSecondFactor
                  ? 'Everybody here needs a second factor'
                  : 'A second factor is offered, not required'
              }
            >
              <p>
                {data.requireSecondFactor
                  ? 'Whoever has none sets one up at the next sign-in, before anything else.'
                  : 'Without one, a stolen password is enough to read customers’ addresses and allergies.'}
              </p>
            </Notice>
            <Rim label="People" className="overflow-hidden">
              <PeopleList people={data} zone={zone} locale={locale} />
            </Rim>
          </div>
          {data.can.invite && (
            <Section title="Invite somebody">
              <InviteForm />
            </Section>
          )}
        </div>
      )}
    </div>
  );
}
