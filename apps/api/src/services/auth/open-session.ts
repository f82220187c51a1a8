import type { Session } from '@tipward/contract';
import type { Context } from '../../context.ts';
import type { Cookies } from '../../http/cookies.ts';
import { describeSession } from './describe-session.ts';
import { loadActor } from './load-actor.ts';
import { writeSessionCookies, type TokenPair } from './session-cookies.ts';

/** Hands the tokens of a family to the browser and says who is signed in. Null when they may no longer enter. */
export async function openSession(
  context: Context,
  cookies: Cookies,
  tokens: { readonly personId: string; readonly familyId: string; readonly pair: TokenPair },
): Promise<Session | null> {
  const actor = await loadActor(tokens.personId);
  if (actor === null) return null;
  writeSessionCookies(cookies, tokens.pair);
  return describeSession(context, { actor, familyId: tokens.familyId });
}
