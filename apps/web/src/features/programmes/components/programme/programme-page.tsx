import type { Programme } from '@tipward/contract';
import { useState } from 'react';
import { Button } from '../../../../components/ui/button.tsx';
import { ButtonLink } from '../../../../components/ui/button-link.tsx';
import { Loaded } from '../../../../components/ui/loaded.tsx';
import { Moment } from '../../../../components/ui/moment.tsx';
import { PageHeader } from '../../../../components/ui/page-header.tsx';
import { useProgramme } from '../../api/get-programme.ts';
import { DesignsSection } from './designs-section.tsx';
import { EditProgramme } from './edit-programme.tsx';
import { MembersSection } from './members-section.tsx';
import { ReleasedSection } from './released-section.tsx';
import { RequirementsSection } from './requirements-section.tsx';
import { ReviewsSection } from './reviews-section.tsx';

function Actions({ programme }: { programme: Programme }) {
  const [editing, setEditing] = useState(false);
  const { id, abilities } = programme;
  return (
    <>
      <ButtonLink to={`/programmes/${id}/specification`}>Specification</ButtonLink>
      {abilities.edit && (
        <Button
          onClick={() => {
            setEditing(true);
          }}
        >
          Rename
        </Button>
      )}
      {abilities.createDesign && (
        <ButtonLink kind="primary" to={`/programmes/${id}/designs/new`}>
          New design
        </ButtonLink>
      )}
      {editing && (
        <EditProgramme
          programmeId={id}
          onClose={() => {
            setEditing(false);
          }}
        />
      )}
    </>
  );
}

/** What is released, what is in work, and does it meet the specification? */
export function ProgrammePage({ programmeId }: { programmeId: string }) {
  const programme = useProgramme(programmeId);
  return (
    <Loaded query={programme} what="the programme">
      {(data) => (
        <>
          <PageHeader
            title={data.name}
            trail={[{ label: 'Programmes', to: '/' }]}
            meta={
              <>
                {data.summary !== '' && (
                  <span className="block max-w-prose wrap-anywhere text-ink">{data.summary}</span>
                )}
                Your role: {data.role ?? 'none'}. Specification issue {data.latestIssue} by{' '}
                {data.specification.issuedBy.name}, <Moment at={data.specification.issuedAt} />.
              </>
            }
            actions={<Actions programme={data} />}
          />
          <ReleasedSection programme={data} />
          <RequirementsSection programme={data} />
          {data.abilities.seeWork && <DesignsSection programme={data} />}
          {data.abilities.seeWork && <ReviewsSection programmeId={data.id} />}
          <MembersSection programme={data} />
        </>
      )}
    </Loaded>
  );
}
