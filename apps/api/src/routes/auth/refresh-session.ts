import { refreshSession } from '@tipward/contract';
import { publicRoute } from '../../http/route.ts';
import { refreshSession as refresh } from '../../services/auth/refresh-session.ts';

export const refreshSessionRoute = publicRoute(refreshSession, ({ context, cookies }) =>
  refresh(context, cookies),
);
