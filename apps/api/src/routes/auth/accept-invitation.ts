import { acceptInvitation } from '@tipward/contract';
import { linkLimits } from '../../http/rate-limits.ts';
import { publicRoute } from '../../http/route.ts';
import { acceptInvitation as accept } from '../../services/auth/accept-invitation.ts';

export const acceptInvitationRoute = publicRoute(
  acceptInvitation,
  ({ context, cookies, body }) => accept(context, cookies, body),
  { before: linkLimits },
);
