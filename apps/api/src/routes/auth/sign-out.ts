import { signOut } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { signOut as endSession } from '../../services/auth/sign-out.ts';

export const signOutRoute = route(signOut, async ({ context, actor, cookies, familyId }) => {
  await endSession(context, actor, cookies, familyId);
  return undefined;
});
