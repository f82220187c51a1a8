import { getSession } from '@tipward/contract';
import { AppError } from '../../http/app-error.ts';
import { publicRoute } from '../../http/route.ts';
import { describeSession } from '../../services/auth/describe-session.ts';
import { REFRESH_COOKIE } from '../../services/auth/session-cookies.ts';

/** Nobody is an answer; but someone whose access token has run out is told to refresh it, by 401 as everywhere. */
export const getSessionRoute = publicRoute(getSession, ({ context, actor, cookies, familyId }) => {
  const session = actor === null || familyId === null ? null : { actor, familyId };
  if (session === null && cookies.read(REFRESH_COOKIE) !== null)
    throw new AppError('not-signed-in', 'The access token has run out; refresh the session.');
  return describeSession(context, session);
});
