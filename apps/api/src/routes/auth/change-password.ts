import { changePassword } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { changePassword as change } from '../../services/auth/change-password.ts';

export const changePasswordRoute = route(changePassword, async ({ context, actor, body, familyId }) => {
  await change(context, actor, body, familyId);
  return undefined;
});
