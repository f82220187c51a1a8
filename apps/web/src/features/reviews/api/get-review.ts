import { getReview, getVersion } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useReview = (reviewId: string) => useQuery(apiQuery(getReview, { params: { reviewId } }));

/** The version under review or its parent; null reads nothing. */
export const useReviewedVersion = (versionId: string | null) =>
  useQuery({
    ...apiQuery(getVersion, { params: { versionId: versionId ?? '' } }),
    enabled: versionId !== null,
  });
