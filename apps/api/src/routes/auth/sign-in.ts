import { signIn } from '@tipward/contract';
import { signInLimits } from '../../http/rate-limits.ts';
import { publicRoute } from '../../http/route.ts';
import { signIn as signInPerson } from '../../services/auth/sign-in.ts';

export const signInRoute = publicRoute(
  signIn,
  ({ context, cookies, body, familyId }) => signInPerson(context, cookies, body, familyId),
  { before: signInLimits },
);
