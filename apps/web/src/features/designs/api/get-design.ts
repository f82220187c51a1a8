import { getDesign } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useDesign = (designId: string) => useQuery(apiQuery(getDesign, { params: { designId } }));
