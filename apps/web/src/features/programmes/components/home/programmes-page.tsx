import { ButtonLink } from '../../../../components/ui/button-link.tsx';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { PageHeader } from '../../../../components/ui/page-header.tsx';
import { Section } from '../../../../components/ui/section.tsx';
import { useSession } from '../../../../lib/session/session-query.ts';
import { useProgrammes } from '../../api/list-programmes.ts';
import { OpenDrafts } from './open-drafts.tsx';
import { ProgrammesTable } from './programmes-table.tsx';
import { WaitingList } from './waiting-list.tsx';

/** The first screen: which programmes need me today? */
export function ProgrammesPage() {
  const session = useSession().data;
  const programmes = useProgrammes();
  const person = session?.person;
  if (session === undefined || person === undefined || person === null) return null;
  const works = person.memberships.some(({ role }) => role !== 'reader');
  return (
    <>
      <PageHeader
        title="Programmes"
        actions={session.canCreateProgramme && <ButtonLink to="/programmes/new">New programme</ButtonLink>}
      />
      <Loaded query={programmes} what="the programmes">
        {({ items }) => (
          <>
            {works && <WaitingList personId={person.id} programmes={items} />}
            {works && <OpenDrafts />}
            <Section title="All programmes">
              <ProgrammesTable programmes={items} session={session} />
            </Section>
          </>
        )}
      </Loaded>
    </>
  );
}
