import { invitePerson } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { invitePerson as invite } from '../../services/people/invite-person.ts';

export const invitePersonRoute = route(invitePerson, ({ context, actor, body }) =>
  invite(context, actor, body),
);
