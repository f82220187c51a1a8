import { listMembers, listPeople, removeMember, setMember } from '@tipward/contract';
import type { Role } from '@tipward/contract';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { callApi } from '../../../lib/api/call-api.ts';

interface Given {
  readonly personId: string;
  readonly programmeId: string;
  /** Null takes the person out of the programme. */
  readonly role: Role | null;
}

export function useGiveRole() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async ({ personId, programmeId, role }: Given) => {
      const params = { programmeId, personId };
      await (role === null
        ? callApi(removeMember, { params })
        : callApi(setMember, { params, body: { role } }));
    },
    onSettled: () =>
      Promise.all([listPeople, listMembers].map(({ id }) => client.invalidateQueries({ queryKey: [id] }))),
  });
}
