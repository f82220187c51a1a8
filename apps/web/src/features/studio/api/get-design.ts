import { getDesign } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

/** The design the draft belongs to, for the versions it can be compared with. */
export const useDesign = (designId: string) => useQuery(apiQuery(getDesign, { params: { designId } }));
