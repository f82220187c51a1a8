import { removeMember } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { removeMember as remove } from '../../services/people/remove-member.ts';

export const removeMemberRoute = route(removeMember, async ({ context, actor, params }) => {
  await remove(context, actor, params.programmeId, params.personId);
  return undefined;
});
