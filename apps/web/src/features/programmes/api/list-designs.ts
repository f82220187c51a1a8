import { listDesigns } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

/** Designs are work: asked for only where the role shows it. */
export const useDesigns = (programmeId: string, mayRead: boolean) =>
  useQuery({ ...apiQuery(listDesigns, { params: { programmeId } }), enabled: mayRead });
