import { requestPasswordReset } from '@tipward/contract';
import { resetLimits } from '../../http/rate-limits.ts';
import { publicRoute } from '../../http/route.ts';
import { requestPasswordReset as request } from '../../services/auth/request-password-reset.ts';

export const requestPasswordResetRoute = publicRoute(
  requestPasswordReset,
  async ({ context, body }) => {
    await request(context, body.email);
    return undefined;
  },
  { before: resetLimits },
);
