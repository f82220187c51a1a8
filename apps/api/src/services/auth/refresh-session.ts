import type { Session } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { AppError } from '../../http/app-error.ts';
import type { Cookies } from '../../http/cookies.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { openSession } from './open-session.ts';
import { clearSessionCookies, REFRESH_COOKIE } from './session-cookies.ts';
import { rotate, type Rotation } from './token-families.ts';

async function rotateAndNote(context: Context, token: string): Promise<Rotation> {
  return inTransaction(context, async (transaction) => {
    const rotation = await rotate(context, transaction, token);
    if (rotation.kind === 'reused')
      await writeAudit(context, transaction, {
        actorId: null,
        action: 'auth.refresh-token-reused',
        subjectKind: 'person',
        subjectId: rotation.personId,
      });
    return rotation;
  });
}

/** @throws AppError `not-signed-in` when the cookie is missing, spent or of an ended family; both cookies go then */
export async function refreshSession(context: Context, cookies: Cookies): Promise<Session> {
  const token = cookies.read(REFRESH_COOKIE);
  const rotation = token === null ? null : await rotateAndNote(context, token);
  const session = rotation?.kind === 'rotated' ? await openSession(context, cookies, rotation) : null;
  if (session === null) {
    clearSessionCookies(cookies);
    throw new AppError('not-signed-in', 'The session has ended; sign in again.');
  }
  return session;
}
