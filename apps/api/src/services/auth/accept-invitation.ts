import type { acceptInvitation as operation, BodyOf, Session } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { AppError } from '../../http/app-error.ts';
import type { Cookies } from '../../http/cookies.ts';
import { Person } from '../../models/person.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { useLink } from './one-time-links.ts';
import { openSession } from './open-session.ts';
import { hashPassword } from './password.ts';
import { setPassword } from './set-password.ts';
import { startFamily } from './token-families.ts';

/** Takes up an invitation: name and password are set and the person is signed in. */
export async function acceptInvitation(
  context: Context,
  cookies: Cookies,
  given: BodyOf<typeof operation>,
): Promise<Session> {
  const passwordHash = await hashPassword(context, given.password);
  const tokens = await inTransaction(context, async (transaction) => {
    const personId = await useLink(transaction, given.token, 'invitation');
    await setPassword(transaction, personId, passwordHash);
    await Person.update(
      { name: given.name, lastSeenAt: new Date() },
      { where: { id: personId }, transaction },
    );
    const started = await startFamily(context, transaction, personId);
    await writeAudit(context, transaction, {
      actorId: personId,
      action: 'people.invitation-accepted',
      subjectKind: 'person',
      subjectId: personId,
    });
    return { personId, ...started };
  });
  const session = await openSession(context, cookies, tokens);
  if (session === null) throw new AppError('not-signed-in', 'The account is closed.');
  return session;
}
