import { Loaded } from '../../../components/ui/loaded.tsx';
import { useDraft } from '../api/get-draft.ts';
import { useSpecifications } from '../api/list-specifications.ts';
import type { Draft } from '@tipward/contract';
import { Studio } from './studio.tsx';

function WithSpecification({ draft }: { draft: Draft }) {
  return (
    <Loaded query={useSpecifications(draft.programmeId)} what="the specification">
      {(issues) => <Studio key={draft.id} draft={draft} issues={issues.items} />}
    </Loaded>
  );
}

/** Reads a draft and opens the studio on it. */
export function OpenStudio({ draftId }: { draftId: string }) {
  return (
    <Loaded query={useDraft(draftId)} what="the draft">
      {(draft) => <WithSpecification draft={draft} />}
    </Loaded>
  );
}
