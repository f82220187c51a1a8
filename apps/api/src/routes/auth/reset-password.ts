import { resetPassword } from '@tipward/contract';
import { linkLimits } from '../../http/rate-limits.ts';
import { publicRoute } from '../../http/route.ts';
import { resetPassword as reset } from '../../services/auth/reset-password.ts';

export const resetPasswordRoute = publicRoute(
  resetPassword,
  async ({ context, body }) => {
    await reset(context, body);
    return undefined;
  },
  { before: linkLimits },
);
