import type { Person } from '@tipward/contract';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { Loaded } from '../../../components/ui/loaded.tsx';
import { PageHeader } from '../../../components/ui/page-header.tsx';
import { DataTable } from '../../../components/ui/table/data-table.tsx';
import { useSession } from '../../../lib/session/session-query.ts';
import { usePeople } from '../api/list-people.ts';
import { InviteDialog } from './invite-dialog.tsx';
import { peopleColumns } from './people-columns.tsx';
import { RightsDialog } from './rights-dialog.tsx';
import { RolesDialog } from './roles-dialog.tsx';

type Open = { dialog: 'roles' | 'rights'; personId: string } | { dialog: 'invite' } | null;

function Dialogs({ open, people, onClose }: { open: Open; people: readonly Person[]; onClose: () => void }) {
  if (open?.dialog === 'invite') return <InviteDialog onClose={onClose} />;
  const person = people.find((one) => one.id === open?.personId);
  if (open === null || person === undefined) return null;
  return open.dialog === 'roles' ? (
    <RolesDialog person={person} onClose={onClose} />
  ) : (
    <RightsDialog person={person} onClose={onClose} />
  );
}

export function PeoplePage() {
  const people = usePeople();
  const me = useSession().data?.person?.id;
  const [open, setOpen] = useState<Open>(null);
  const columns = peopleColumns({
    me,
    onRoles: (personId) => {
      setOpen({ dialog: 'roles', personId });
    },
    onRights: (personId) => {
      setOpen({ dialog: 'rights', personId });
    },
  });
  return (
    <>
      <PageHeader
        title="People"
        meta="Who may sign in, and what each may do in which programme"
        actions={
          <Button
            kind="primary"
            onClick={() => {
              setOpen({ dialog: 'invite' });
            }}
          >
            Invite a person
          </Button>
        }
      />
      <Loaded query={people} what="the people">
        {({ items }) => (
          <>
            <DataTable
              label="People"
              rows={items}
              columns={columns}
              rowKey={(person) => person.id}
              initialSort={{ columnId: 'name', descending: false }}
              toolsFrom={0}
              empty={<EmptyState title="Nobody is here yet." />}
            />
            <Dialogs
              open={open}
              people={items}
              onClose={() => {
                setOpen(null);
              }}
            />
          </>
        )}
      </Loaded>
    </>
  );
}
