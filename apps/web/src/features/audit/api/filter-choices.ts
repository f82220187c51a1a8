import { listPeople, listProgrammes } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

/** Whom and what the audit can be filtered by. */
export function useFilterChoices() {
  const people = useQuery(apiQuery(listPeople, {}));
  const programmes = useQuery(apiQuery(listProgrammes, {}));
  return { people: people.data?.items ?? [], programmes: programmes.data?.items ?? [] };
}
