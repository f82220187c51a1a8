import { getSession, listPeople, resendInvitation, updatePerson } from '@tipward/contract';
import type { Person } from '@tipward/contract';
import { Button } from '../../../components/ui/button.tsx';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { notify } from '../../../components/ui/notify.ts';
import { Problem } from '../../../components/ui/problem.tsx';
import { useApiMutation } from '../../../lib/api/api-query.ts';

function Choice({
  does,
  label,
  danger,
  busy,
  onClick,
}: {
  does: string;
  label: string;
  danger?: boolean;
  busy: boolean;
  onClick: () => void;
}) {
  return (
    <div className="flex flex-wrap items-center justify-between gap-3 border-t border-rule pt-3">
      <p className="m-0 min-w-0 flex-1 basis-60">{does}</p>
      <Button kind={danger === true ? 'danger' : 'plain'} busy={busy} onClick={onClick}>
        {label}
      </Button>
    </div>
  );
}

/** What concerns the account as a whole. Disabling can be undone, so it asks no second time. */
export function RightsDialog({ person, onClose }: { person: Person; onClose: () => void }) {
  const change = useApiMutation(updatePerson, [listPeople, getSession]);
  const resend = useApiMutation(resendInvitation);
  const set = (body: { isAdministrator?: boolean; disabled?: boolean }) => {
    change.mutate({ params: { personId: person.id }, body });
  };
  const disabled = person.status === 'disabled';
  return (
    <Dialog open onOpenChange={onClose} title={person.name} description={person.email}>
      {person.status === 'invited' && (
        <Choice
          does="The invitation has not been taken up. A new one ends the link of the old."
          label="Send it again"
          busy={resend.isPending}
          onClick={() => {
            resend.mutate(
              { params: { personId: person.id } },
              {
                onSuccess: () => {
                  notify.done(`A new invitation is on its way to ${person.email}.`);
                },
              },
            );
          }}
        />
      )}
      <Choice
        does={
          person.isAdministrator
            ? 'Administrator: manages people, reads the audit, sees every programme.'
            : 'Not an administrator.'
        }
        label={person.isAdministrator ? 'Take the administrator right' : 'Make administrator'}
        busy={change.isPending && change.variables.body.isAdministrator !== undefined}
        onClick={() => {
          set({ isAdministrator: !person.isAdministrator });
        }}
      />
      <Choice
        does={
          disabled
            ? 'Disabled: cannot sign in. All they made stands.'
            : 'Disabling ends every session at once. All they made stands, and it can be undone.'
        }
        label={disabled ? 'Enable' : 'Disable'}
        danger={!disabled}
        busy={change.isPending && change.variables.body.disabled !== undefined}
        onClick={() => {
          set({ disabled: !disabled });
        }}
      />
      {change.error !== null && <Problem error={change.error} />}
      {resend.error !== null && <Problem error={resend.error} />}
    </Dialog>
  );
}
