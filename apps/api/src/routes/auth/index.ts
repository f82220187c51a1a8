import { acceptInvitationRoute } from './accept-invitation.ts';
import { changePasswordRoute } from './change-password.ts';
import { getSessionRoute } from './get-session.ts';
import { refreshSessionRoute } from './refresh-session.ts';
import { requestPasswordResetRoute } from './request-password-reset.ts';
import { resetPasswordRoute } from './reset-password.ts';
import { signInRoute } from './sign-in.ts';
import { signOutRoute } from './sign-out.ts';
import { signOutEverywhereRoute } from './sign-out-everywhere.ts';

export const authRoutes = [
  getSessionRoute,
  signInRoute,
  refreshSessionRoute,
  signOutRoute,
  signOutEverywhereRoute,
  changePasswordRoute,
  requestPasswordResetRoute,
  resetPasswordRoute,
  acceptInvitationRoute,
];
