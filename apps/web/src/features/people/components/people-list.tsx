import { useState } from 'react';
import type { StaffPeople } from '#shared/contracts/accounts.ts';
import { staffRoles } from '#shared/contracts/vocabulary.ts';
import { instantWords } from '#web/components/order/order-times.ts';
import { Button } from '#web/components/ui/button.tsx';
import { Dialog } from '#web/components/ui/dialog.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { RadioGroup } from '#web/components/ui/radio-group.tsx';
import { useToast } from '#web/components/ui/toast.tsx';
import { VisuallyHidden } from '#web/components/ui/visually-hidden.tsx';
import { useChangeRole } from '../api/change-role.ts';
import { useEndRole } from '../api/end-role.ts';
import { useSendInvitationAgain } from '../api/send-invitation-again.ts';
import { roleWords } from './role-words.ts';

type Person = StaffPeople['people'][number];

type Props = {
  readonly people: StaffPeople;
  readonly zone: string;
  readonly locale: string;
};

type Asking = { readonly what: 'role' | 'end'; readonly person: Person };

/** Everybody who works here, with their role and what may be done about it. */
export function PeopleList({ people, zone, locale }: Props) {
  const [asking, setAsking] = useState<Asking | null>(null);
  const again = useSendInvitationAgain();
  const toast = useToast();
  const here = people.people.filter((it) => it.state !== 'ended');
  const gone = people.people.filter((it) => it.state === 'ended');
  return (
    <div className="grid gap-3">
      {again.isError && <Failure error={again.error} />}
      <ul className="divide-y divide-seam">
        {here.map((person) => (
          <li
            key={person.id}
            className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 px-4 py-4 sm:px-6"
          >
            <div className="min-w-0">
              <p>
                <strong>{person.name}</strong>, {person.role}
              </p>
              <p className="text-sm break-all text-slate">{person.email}</p>
              <p className="text-sm text-slate">
                {person.state === 'invited'
                  ? 'invited, has not answered yet'
                  : [
                      person.secondFactor ? 'second factor set up' : 'no second factor',
                      person.lastSeenAt === null
                        ? 'not been here yet'
                        : `last here ${instantWords(person.lastSeenAt, zone, locale)}`,
                    ].join(', ')}
              </p>
            </div>
            <div className="flex flex-wrap gap-2">
              {person.can.invite && (
                <Button
                  kind="quiet"
                  pending={again.isPending && again.variables === person.id}
                  onClick={() =>
                    again.mutate(person.id, {
                      onSuccess: () =>
                        toast({
                          message: `A new invitation is on its way to ${person.email}; the earlier link is shut.`,
                        }),
                    })
                  }
                >
                  Send it again<VisuallyHidden> to {person.name}</VisuallyHidden>
                </Button>
              )}
              {person.can.changeRole && (
                <Button kind="quiet" onClick={() => setAsking({ what: 'role', person })}>
                  Change the role<VisuallyHidden> of {person.name}</VisuallyHidden>
                </Button>
              )}
              {person.can.end && (
                <Button kind="quiet" onClick={() => setAsking({ what: 'end', person })}>
                  {person.state === 'invited' ? 'Withdraw it' : 'End the role'}
                  <VisuallyHidden> of {person.name}</VisuallyHidden>
                </Button>
              )}
            </div>
          </li>
        ))}
      </ul>
      {gone.length > 0 && (
        <p className="px-4 pb-4 text-sm text-slate sm:px-6">
          Worked here before: {gone.map((it) => it.name).join(', ')}.
        </p>
      )}
      {asking?.what === 'role' && (
        <ChangeRoleDialog person={asking.person} onClose={() => setAsking(null)} />
      )}
      {asking?.what === 'end' && (
        <EndRoleDialog person={asking.person} onClose={() => setAsking(null)} />
      )}
    </div>
  );
}

type DialogProps = { readonly person: Person; readonly onClose: () => void };

function ChangeRoleDialog({ person, onClose }: DialogProps) {
  const [role, setRole] = useState(person.role);
  const change = useChangeRole();
  const toast = useToast();
  return (
    <Dialog open onClose={onClose} title={`The role of ${person.name}`}>
      {change.isError && <Failure error={change.error} />}
      <RadioGroup
        legend="Role"
        value={role}
        onValue={setRole}
        rows={staffRoles.map((value) => ({
          value,
          label: roleWords[value].name,
          description: roleWords[value].may,
        }))}
      />
      <p>{person.name} is signed out everywhere and signs in again with the new role.</p>
      <div className="flex flex-wrap gap-3">
        <Button
          pending={change.isPending}
          onClick={() => {
            if (role === person.role) onClose();
            else {
              change.mutate(
                { id: person.id, role },
                {
                  onSuccess: () => {
                    toast({ message: `${person.name} is ${role} now.` });
                    onClose();
                  },
                },
              );
            }
          }}
        >
          Change it
        </Button>
        <Button kind="quiet" onClick={onClose}>
          Leave it
        </Button>
      </div>
    </Dialog>
  );
}

function EndRoleDialog({ person, onClose }: DialogProps) {
  const end = useEndRole();
  const toast = useToast();
  const invited = person.state === 'invited';
  return (
    <Dialog
      open
      onClose={onClose}
      title={
        invited ? `Withdraw the invitation of ${person.name}` : `End the role of ${person.name}`
      }
    >
      {end.isError && <Failure error={end.error} />}
      <p>
        {invited
          ? 'The link in the e-mail opens nothing any more.'
          : `${person.name} is signed out everywhere at once and cannot sign in any more. What they did stays noted with the orders.`}
      </p>
      <div className="flex flex-wrap gap-3">
        <Button
          kind="danger"
          pending={end.isPending}
          onClick={() =>
            end.mutate(person.id, {
              onSuccess: () => {
                toast({
                  message: invited
                    ? `The invitation of ${person.name} is withdrawn.`
                    : `${person.name} no longer works here.`,
                });
                onClose();
              },
            })
          }
        >
          {invited ? 'Withdraw it' : 'End the role'}
        </Button>
        <Button kind="quiet" onClick={onClose}>
          Leave it
        </Button>
      </div>
    </Dialog>
  );
}
