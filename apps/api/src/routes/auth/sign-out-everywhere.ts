import { signOutEverywhere } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { signOutEverywhere as endAllSessions } from '../../services/auth/sign-out.ts';

export const signOutEverywhereRoute = route(signOutEverywhere, async ({ context, actor, cookies }) => {
  await endAllSessions(context, actor, cookies);
  return undefined;
});
