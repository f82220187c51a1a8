import { listDrafts, listVersions } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export interface Choice {
  readonly kind: 'version' | 'draft';
  readonly id: string;
  readonly label: string;
}

/** Versions of the programme and the person's own drafts in it. */
export function useChoices(programmeId: string | null): readonly Choice[] {
  const versions = useQuery({
    ...apiQuery(listVersions, { params: { programmeId: programmeId ?? '' } }),
    enabled: programmeId !== null,
  });
  const drafts = useQuery({ ...apiQuery(listDrafts, {}), enabled: programmeId !== null });
  return [
    ...(versions.data?.items ?? []).map(({ id, designName, label, note }) => ({
      kind: 'version' as const,
      id,
      label: `${designName} ${label}: ${note}`,
    })),
    ...(drafts.data?.items ?? [])
      .filter((draft) => draft.programmeId === programmeId)
      .map(({ id, designName, parentLabel }) => ({
        kind: 'draft' as const,
        id,
        label: `${designName}, draft${parentLabel === null ? '' : ` from ${parentLabel}`}`,
      })),
  ];
}
