import type { Programme } from '@tipward/contract';
import { Link } from 'react-router-dom';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { Section } from '../../../../components/ui/section.tsx';
import { useMembers } from '../../api/list-members.ts';

export function MembersSection({ programme }: { programme: Programme }) {
  const members = useMembers(programme.id);
  return (
    <Section
      title="People"
      actions={
        programme.abilities.manageMembers && (
          <Link to="/people" className="link">
            Change roles
          </Link>
        )
      }
    >
      <Loaded query={members} what="the members">
        {({ items }) =>
          items.length === 0 ? (
            <p className="m-0 py-1 text-ink-soft">Nobody has a role in this programme.</p>
          ) : (
            <ul className="m-0 flex list-none flex-wrap gap-x-8 gap-y-1 p-0">
              {items.map((member) => (
                <li key={member.person.id}>
                  {member.person.name} <span className="text-ink-soft">{member.role}</span>
                </li>
              ))}
            </ul>
          )
        }
      </Loaded>
    </Section>
  );
}
