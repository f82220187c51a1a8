import { MemoryStore } from 'express-rate-limit';
import type { Options } from 'express-rate-limit';
import type { Context } from '../../context.ts';
import { AppError, invalid } from '../../http/app-error.ts';
import { Credential } from '../../models/credential.ts';
import type { Actor } from '../../policies/actor.ts';
import { passwordMatches } from './password.ts';

const WINDOW_MS = 15 * 60 * 1000;

/** Wrong passwords of signed-in people; in memory, so each server process counts its own. */
const failures = new MemoryStore();
failures.init({ windowMs: WINDOW_MS } as Options);

/**
 * Asks a signed-in person for the password again, before a signature.
 * @param field name of the field it came in, for the fault
 * @throws AppError `invalid` when it is wrong, `too-many-requests` after too many wrong ones
 */
export async function confirmPassword(
  context: Context,
  actor: Actor,
  password: string,
  field = 'password',
): Promise<void> {
  const earlier = await failures.get(actor.personId);
  if ((earlier?.totalHits ?? 0) >= context.config.signInFailuresAllowed)
    throw new AppError('too-many-requests', 'Too many wrong passwords; wait a quarter of an hour.', {
      retryAfterSeconds: WINDOW_MS / 1000,
    });
  const credential = await Credential.findByPk(actor.personId);
  if (await passwordMatches(context, password, credential?.passwordHash ?? null)) {
    await failures.resetKey(actor.personId);
    return;
  }
  await failures.increment(actor.personId);
  throw invalid([{ field, value: 'hidden', message: 'Password is wrong; allowed: your own' }]);
}
