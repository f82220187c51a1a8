import type { Design } from '@tipward/contract';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { ButtonLink } from '../../../components/ui/button-link.tsx';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { Problem } from '../../../components/ui/problem.tsx';
import { Section } from '../../../components/ui/section.tsx';
import { DataTable } from '../../../components/ui/table/data-table.tsx';
import { useOpenDraft } from '../api/open-draft.ts';
import { compareAddress, FEWEST_COMPARED, MOST_COMPARED } from '../lib/compare-address.ts';
import { versionColumns } from './version-columns.tsx';
import { VersionTree } from './version-tree.tsx';

function CompareLink({ chosen }: { chosen: readonly string[] }) {
  if (chosen.length < FEWEST_COMPARED)
    return (
      <span className="text-[13px] text-ink-soft">
        Choose {FEWEST_COMPARED} to {MOST_COMPARED} versions to compare.
      </span>
    );
  return (
    <ButtonLink small kind="primary" to={compareAddress(chosen)}>
      Compare {chosen.length} versions
    </ButtonLink>
  );
}

/** All versions with what they amount to; some can be compared, each can be gone on from. */
export function VersionsSection({ design }: { design: Design }) {
  const [chosen, setChosen] = useState<readonly string[]>([]);
  const open = useOpenDraft();
  const navigate = useNavigate();
  const openDraft = (fromVersionId: string) => {
    open.mutate(
      { params: { designId: design.id }, body: { fromVersionId } },
      { onSuccess: (draft) => void navigate(`/drafts/${draft.id}`) },
    );
  };
  const columns = versionColumns({
    chosen,
    most: MOST_COMPARED,
    onToggle: (id) => {
      setChosen(chosen.includes(id) ? chosen.filter((one) => one !== id) : [...chosen, id]);
    },
    onOpenDraft: design.abilities.openDraft ? openDraft : null,
    opening: open.isPending ? open.variables.body.fromVersionId : null,
  });
  return (
    <Section title="Versions" note="A version never changes once saved.">
      {open.error !== null && <Problem error={open.error} title="No draft was opened." />}
      {design.versions.length > 1 && <VersionTree versions={design.versions} />}
      <DataTable
        label={`Versions of ${design.name}`}
        rows={design.versions}
        columns={columns}
        rowKey={({ id }) => id}
        initialSort={{ columnId: 'number', descending: true }}
        tools={design.versions.length > 1 && <CompareLink chosen={chosen} />}
        empty={
          <EmptyState title="No version yet">
            A version is saved from a draft, with a note; the server evaluates it and keeps it for good.
          </EmptyState>
        }
      />
    </Section>
  );
}
