import { listCaughtMail } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

/** Looks again every few seconds: mail leaves by a worker, a moment after what caused it. */
export const useCaughtMail = () => useQuery({ ...apiQuery(listCaughtMail, {}), refetchInterval: 3_000 });
