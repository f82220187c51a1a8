import type { Design } from '@tipward/contract';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { Loaded } from '../../../components/ui/loaded.tsx';
import { Moment } from '../../../components/ui/moment.tsx';
import { PageHeader } from '../../../components/ui/page-header.tsx';
import { StateBadge } from '../../../components/ui/state-badge.tsx';
import { useDesign } from '../api/get-design.ts';
import { DraftsSection } from './drafts-section.tsx';
import { RenameDesign } from './rename-design.tsx';
import { VersionsSection } from './versions-section.tsx';

function Header({ design }: { design: Design }) {
  const [renaming, setRenaming] = useState(false);
  const latest = design.latestVersion;
  return (
    <>
      <PageHeader
        title={design.name}
        trail={[
          { label: 'Programmes', to: '/' },
          { label: design.programmeName, to: `/programmes/${design.programmeId}` },
        ]}
        state={latest !== null && <StateBadge state={latest.state} letter={latest.release?.letter} />}
        meta={
          latest === null ? (
            <>
              Started by {design.createdBy.name} <Moment at={design.createdAt} />, no version yet
            </>
          ) : (
            <>
              Latest {latest.label} by {latest.author.name} <Moment at={latest.savedAt} />
            </>
          )
        }
        actions={
          design.abilities.rename && (
            <Button
              onClick={() => {
                setRenaming(true);
              }}
            >
              Rename
            </Button>
          )
        }
      />
      {renaming && (
        <RenameDesign
          designId={design.id}
          onClose={() => {
            setRenaming(false);
          }}
        />
      )}
    </>
  );
}

export function DesignPage({ designId }: { designId: string }) {
  const design = useDesign(designId);
  return (
    <Loaded query={design} what="the design">
      {(data) => (
        <>
          <Header design={data} />
          <DraftsSection design={data} />
          <VersionsSection design={data} />
        </>
      )}
    </Loaded>
  );
}
