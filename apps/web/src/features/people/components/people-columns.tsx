import type { Person } from '@tipward/contract';
import { Button } from '../../../components/ui/button.tsx';
import { classNames } from '../../../components/ui/class-names.ts';
import { Moment } from '../../../components/ui/moment.tsx';
import type { Column } from '../../../components/ui/table/column.ts';
import { roleText, STATUS_WORDS } from '../lib/role-names.ts';

const LOOKS: Record<Person['status'], string> = {
  active: '',
  invited: 'text-look',
  disabled: 'text-fails',
};

interface Actions {
  readonly me: string | undefined;
  readonly onRoles: (personId: string) => void;
  readonly onRights: (personId: string) => void;
}

function RowButtons({ person, onRoles, onRights }: Omit<Actions, 'me'> & { person: Person }) {
  return (
    <span className="flex gap-1">
      <Button
        small
        kind="quiet"
        aria-label={`Roles of ${person.name}`}
        onClick={() => {
          onRoles(person.id);
        }}
      >
        Roles
      </Button>
      <Button
        small
        kind="quiet"
        aria-label={`Account of ${person.name}`}
        onClick={() => {
          onRights(person.id);
        }}
      >
        Account
      </Button>
    </span>
  );
}

export function peopleColumns({ me, ...actions }: Actions): Column<Person>[] {
  return [
    {
      id: 'name',
      header: 'Name',
      cell: (person) => `${person.name}${person.id === me ? ' (you)' : ''}`,
      sort: (person) => person.name,
      text: (person) => person.name,
    },
    {
      id: 'email',
      header: 'E-mail',
      cell: (person) => person.email,
      sort: (person) => person.email,
      text: (person) => person.email,
      wideOnly: true,
    },
    {
      id: 'status',
      header: 'Account',
      cell: (person) => (
        <span className={classNames(LOOKS[person.status])}>{STATUS_WORDS[person.status]}</span>
      ),
      sort: (person) => person.status,
      text: (person) => person.status,
    },
    {
      id: 'roles',
      header: 'Roles',
      cell: (person) =>
        [person.isAdministrator ? 'administrator' : '', roleText(person.memberships)]
          .filter(Boolean)
          .join('; ') || '–',
      text: (person) =>
        [person.isAdministrator ? 'administrator' : '', roleText(person.memberships)]
          .filter(Boolean)
          .join('; '),
      wideOnly: true,
    },
    {
      id: 'seen',
      header: 'Last here',
      cell: (person) =>
        person.lastSeenAt === null ? (
          <span title="never signed in">–</span>
        ) : (
          <Moment at={person.lastSeenAt} />
        ),
      sort: (person) => person.lastSeenAt,
      text: (person) => person.lastSeenAt,
      wideOnly: true,
    },
    { id: 'actions', header: 'Change', cell: (person) => <RowButtons person={person} {...actions} /> },
  ];
}
