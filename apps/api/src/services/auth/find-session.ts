import { Op } from 'sequelize';
import type { Context } from '../../context.ts';
import type { Cookies } from '../../http/cookies.ts';
import { Person } from '../../models/person.ts';
import { SessionFamily } from '../../models/session-family.ts';
import type { Actor } from '../../policies/actor.ts';
import { readAccessToken } from './access-token.ts';
import { loadActor } from './load-actor.ts';
import { ACCESS_COOKIE } from './session-cookies.ts';

export interface LiveSession {
  readonly actor: Actor;
  readonly familyId: string;
}

const SEEN_EVERY_MS = 5 * 60 * 1000;

async function noteSeen(personId: string): Promise<void> {
  const now = new Date();
  const earlier = new Date(now.getTime() - SEEN_EVERY_MS);
  await Person.update(
    { lastSeenAt: now },
    { where: { id: personId, lastSeenAt: { [Op.or]: [{ [Op.is]: null }, { [Op.lt]: earlier }] } } },
  );
}

/**
 * The session behind a request. Asked of the database each time, so that a person who is disabled, or signs out
 * everywhere, is out at once and not when the token expires.
 */
export async function findSession(context: Context, cookies: Cookies): Promise<LiveSession | null> {
  const token = cookies.read(ACCESS_COOKIE);
  const access = token === null ? null : readAccessToken(context, token);
  if (access === null) return null;
  const [family, actor] = await Promise.all([
    SessionFamily.findByPk(access.familyId),
    loadActor(access.personId),
  ]);
  if (actor === null || family === null || family.endedAt !== null || family.personId !== access.personId)
    return null;
  await noteSeen(actor.personId);
  return { actor, familyId: family.id };
}
