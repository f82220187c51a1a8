import { setMember } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { setMember as set } from '../../services/people/set-member.ts';

export const setMemberRoute = route(setMember, async ({ context, actor, params, body }) => {
  await set(context, actor, params.personId, { programmeId: params.programmeId, role: body.role });
  return undefined;
});
