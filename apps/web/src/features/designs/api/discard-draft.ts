import { discardDraft, getDesign, getDraft, listDrafts } from '@tipward/contract';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { callApi, callApiTagged } from '../../../lib/api/call-api.ts';

/** Discards a draft as it stands at this moment: whoever confirms has been told that all of it goes. */
export function useDiscardDraft() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (draftId: string) => {
      const params = { draftId };
      const { etag } = await callApiTagged(getDraft, { params });
      await callApi(discardDraft, { params, ifMatch: etag ?? '' });
    },
    onSuccess: () =>
      Promise.all([getDesign, listDrafts].map(({ id }) => client.invalidateQueries({ queryKey: [id] }))),
  });
}
