import type { BodyOf, Session, signIn as operation } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { AppError } from '../../http/app-error.ts';
import type { Cookies } from '../../http/cookies.ts';
import { Credential } from '../../models/credential.ts';
import { Person } from '../../models/person.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { openSession } from './open-session.ts';
import { passwordMatches } from './password.ts';
import { endFamily, startFamily } from './token-families.ts';

/** An id that nobody has: an unknown address costs the same look-up. */
const NO_ONE = '00000000-0000-0000-0000-000000000000';

const refused = () => new AppError('not-signed-in', 'E-mail or password is wrong, or the account is closed.');

async function noteFailure(context: Context, personId: string | null): Promise<void> {
  await inTransaction(context, (transaction) =>
    writeAudit(context, transaction, {
      actorId: null,
      action: 'auth.sign-in-failed',
      subjectKind: 'person',
      subjectId: personId,
    }),
  );
}

/**
 * Signs a person in. An unknown address, a wrong password and a closed account take the same steps and get the same
 * answer, so neither its text nor its time tells them apart.
 */
export async function signIn(
  context: Context,
  cookies: Cookies,
  given: BodyOf<typeof operation>,
  earlierFamilyId: string | null,
): Promise<Session> {
  const person = await Person.findOne({ where: { email: given.email } });
  const credential = await Credential.findByPk(person?.id ?? NO_ONE);
  const matches = await passwordMatches(context, given.password, credential?.passwordHash ?? null);
  if (person === null || !matches || person.disabledAt !== null) {
    await noteFailure(context, person?.id ?? null);
    throw refused();
  }
  const tokens = await inTransaction(context, async (transaction) => {
    if (earlierFamilyId !== null) await endFamily(transaction, earlierFamilyId, 'signed-out');
    const started = await startFamily(context, transaction, person.id);
    await person.update({ lastSeenAt: new Date() }, { transaction });
    await writeAudit(context, transaction, {
      actorId: person.id,
      action: 'auth.signed-in',
      subjectKind: 'person',
      subjectId: person.id,
    });
    return started;
  });
  const session = await openSession(context, cookies, { personId: person.id, ...tokens });
  if (session === null) throw refused();
  return session;
}
