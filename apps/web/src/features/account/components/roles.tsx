import type { Person } from '@tipward/contract';
import { Link } from 'react-router-dom';

export function Roles({ person }: { person: Person }) {
  const none = person.memberships.length === 0 && !person.isAdministrator;
  return (
    <ul className="m-0 list-none p-0">
      {person.isAdministrator && <li className="min-h-7">Administrator of this installation</li>}
      {person.memberships.map((membership) => (
        <li key={membership.programmeId} className="min-h-7">
          <Link to={`/programmes/${membership.programmeId}`} className="link">
            {membership.programmeName}
          </Link>
          , {membership.role}
        </li>
      ))}
      {none && <li className="text-ink-soft">No role yet. An administrator gives them.</li>}
    </ul>
  );
}
