import { getVersion } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

/** The version a draft is compared with; null asks for none. */
export function useReferenceVersion(versionId: string | null) {
  return useQuery({
    ...apiQuery(getVersion, { params: { versionId: versionId ?? '' } }),
    enabled: versionId !== null,
  });
}
