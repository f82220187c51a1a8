import { getVersion } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useVersion = (versionId: string) => useQuery(apiQuery(getVersion, { params: { versionId } }));

/** The parent, read only when there is one. */
export const useParent = (versionId: string | null) =>
  useQuery({
    ...apiQuery(getVersion, { params: { versionId: versionId ?? '' } }),
    enabled: versionId !== null,
  });
