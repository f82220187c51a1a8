import { invitePersonRoute } from './invite-person.ts';
import { listMembersRoute } from './list-members.ts';
import { listPeopleRoute } from './list-people.ts';
import { removeMemberRoute } from './remove-member.ts';
import { resendInvitationRoute } from './resend-invitation.ts';
import { setMemberRoute } from './set-member.ts';
import { updatePersonRoute } from './update-person.ts';

export const peopleRoutes = [
  listPeopleRoute,
  invitePersonRoute,
  resendInvitationRoute,
  updatePersonRoute,
  listMembersRoute,
  setMemberRoute,
  removeMemberRoute,
];
