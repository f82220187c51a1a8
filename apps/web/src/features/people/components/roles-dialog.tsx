import { ROLES } from '@tipward/contract';
import type { Person } from '@tipward/contract';
import { Dialog } from '../../../components/ui/dialog.tsx';
import { Loaded } from '../../../components/ui/loaded.tsx';
import { Problem } from '../../../components/ui/problem.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { useGiveRole } from '../api/give-role.ts';
import { useProgrammes } from '../api/list-programmes.ts';
import { ROLE_OPTIONS } from '../lib/role-names.ts';

/** Role in each programme; a choice takes effect at once. */
export function RolesDialog({ person, onClose }: { person: Person; onClose: () => void }) {
  const programmes = useProgrammes();
  const give = useGiveRole();
  const roleIn = (programmeId: string) => {
    const underway = give.isPending && give.variables.programmeId === programmeId ? give.variables : null;
    if (underway !== null) return underway.role ?? '';
    return person.memberships.find((one) => one.programmeId === programmeId)?.role ?? '';
  };
  return (
    <Dialog
      open
      onOpenChange={onClose}
      title={`Roles of ${person.name}`}
      description="A choice takes effect at once."
    >
      <Loaded query={programmes} what="the programmes">
        {({ items }) =>
          items.length === 0 ? (
            <p className="m-0 text-ink-soft">There is no programme yet.</p>
          ) : (
            items.map((programme) => (
              <Select
                key={programme.id}
                label={programme.name}
                options={ROLE_OPTIONS}
                value={roleIn(programme.id)}
                disabled={give.isPending}
                onChange={(event) => {
                  const role = ROLES.find((one) => one === event.target.value) ?? null;
                  give.mutate({ personId: person.id, programmeId: programme.id, role });
                }}
              />
            ))
          )
        }
      </Loaded>
      {give.error !== null && <Problem error={give.error} />}
    </Dialog>
  );
}
