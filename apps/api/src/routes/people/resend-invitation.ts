import { resendInvitation } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { resendInvitation as resend } from '../../services/people/resend-invitation.ts';

export const resendInvitationRoute = route(resendInvitation, async ({ context, actor, params }) => {
  await resend(context, actor, params.personId);
  return undefined;
});
