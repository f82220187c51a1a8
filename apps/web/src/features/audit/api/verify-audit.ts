import { verifyAudit } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useVerification = () => useQuery({ ...apiQuery(verifyAudit, {}), staleTime: 0 });
