import { getProgramme, issueSpecification, listProgrammes, listSpecifications } from '@tipward/contract';
import { useQueryClient } from '@tanstack/react-query';
import { useApiMutation } from '../../../lib/api/api-query.ts';

export const useIssueSpecification = () =>
  useApiMutation(issueSpecification, [listSpecifications, getProgramme, listProgrammes]);

/** Reads the issues anew, once another person has turned out to be first. */
export function useReadIssuesAgain() {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: [listSpecifications.id] });
}
