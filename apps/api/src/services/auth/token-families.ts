import { createHash, createHmac, randomUUID, timingSafeEqual } from 'node:crypto';
import { Op, type Transaction } from 'sequelize';
import type { Context } from '../../context.ts';
import { RefreshSession } from '../../models/refresh-session.ts';
import { SessionFamily } from '../../models/session-family.ts';
import { signAccessToken } from './access-token.ts';
import { keyFor } from './keys.ts';
import { REFRESH_SECONDS, type TokenPair } from './session-cookies.ts';

/** Two tabs may refresh with the same token at once; for this long the second one gets the successor too. */
const GRACE_MS = 10_000;

export type EndReason = 'signed-out' | 'signed-out-everywhere' | 'reused' | 'password-changed' | 'disabled';

const hashOfToken = (token: string): string => createHash('sha256').update(token).digest('hex');

/**
 * The refresh token of a session. It follows from its id and the secret, so that the successor of a used token can be
 * given again within the grace; the table holds only its hash.
 */
function tokenOf(context: Context, id: string): string {
  return `${id}.${createHmac('sha256', keyFor(context, 'refresh')).update(id).digest('base64url')}`;
}

async function createToken(
  context: Context,
  transaction: Transaction,
  familyId: string,
  id: string,
): Promise<string> {
  const token = tokenOf(context, id);
  await RefreshSession.create(
    {
      id,
      familyId,
      tokenHash: hashOfToken(token),
      expiresAt: new Date(Date.now() + REFRESH_SECONDS * 1000),
      usedAt: null,
      successorId: null,
    },
    { transaction },
  );
  return token;
}

/** Signs a person in: a new family with its first pair of tokens. */
export async function startFamily(
  context: Context,
  transaction: Transaction,
  personId: string,
): Promise<{ pair: TokenPair; familyId: string }> {
  const family = await SessionFamily.create({ personId }, { transaction });
  const refresh = await createToken(context, transaction, family.id, randomUUID());
  return {
    pair: { access: signAccessToken(context, { personId, familyId: family.id }), refresh },
    familyId: family.id,
  };
}

export async function endFamily(
  transaction: Transaction,
  familyId: string,
  reason: EndReason,
): Promise<void> {
  await SessionFamily.update(
    { endedAt: new Date(), endedReason: reason },
    { where: { id: familyId, endedAt: null }, transaction },
  );
}

/** Ends the sessions of a person, all or all but one. Returns how many ended. */
export async function endFamiliesOf(
  transaction: Transaction,
  personId: string,
  reason: EndReason,
  exceptFamilyId: string | null = null,
): Promise<number> {
  const others = exceptFamilyId === null ? {} : { id: { [Op.ne]: exceptFamilyId } };
  const [ended] = await SessionFamily.update(
    { endedAt: new Date(), endedReason: reason },
    { where: { personId, endedAt: null, ...others }, transaction },
  );
  return ended;
}

export type Rotation =
  | {
      readonly kind: 'rotated';
      readonly personId: string;
      readonly familyId: string;
      readonly pair: TokenPair;
    }
  | { readonly kind: 'unknown' }
  | { readonly kind: 'reused'; readonly personId: string; readonly familyId: string };

async function findToken(transaction: Transaction, token: string): Promise<RefreshSession | null> {
  const given = hashOfToken(token);
  const found = await RefreshSession.findOne({ where: { tokenHash: given }, transaction });
  return found !== null && timingSafeEqual(Buffer.from(found.tokenHash), Buffer.from(given)) ? found : null;
}

/** The newest token that follows a used one, as long as each step was taken within the grace; null after it. */
async function withinGrace(transaction: Transaction, used: RefreshSession): Promise<RefreshSession | null> {
  let here = used;
  while (here.usedAt !== null && here.successorId !== null) {
    if (Date.now() - here.usedAt.getTime() > GRACE_MS) return null;
    here = await RefreshSession.findByPk(here.successorId, { transaction, rejectOnEmpty: true });
  }
  return here;
}

/** Exchanges a refresh token for a new pair. A token used again after the grace ends its family. */
export async function rotate(context: Context, transaction: Transaction, token: string): Promise<Rotation> {
  const seen = await findToken(transaction, token);
  if (seen === null) return { kind: 'unknown' };
  // Refreshes of one family go one after the other.
  const family = await SessionFamily.findByPk(seen.familyId, { transaction, lock: transaction.LOCK.UPDATE });
  const session = await RefreshSession.findByPk(seen.id, { transaction, rejectOnEmpty: true });
  if (family === null || family.endedAt !== null || session.expiresAt.getTime() <= Date.now())
    return { kind: 'unknown' };
  const who = { personId: family.personId, familyId: family.id };
  const access = signAccessToken(context, who);
  if (session.usedAt !== null) {
    const newest = await withinGrace(transaction, session);
    if (newest !== null)
      return { kind: 'rotated', ...who, pair: { access, refresh: tokenOf(context, newest.id) } };
    await endFamily(transaction, family.id, 'reused');
    return { kind: 'reused', ...who };
  }
  const successorId = randomUUID();
  const refresh = await createToken(context, transaction, family.id, successorId);
  await session.update({ usedAt: new Date(), successorId }, { transaction });
  return { kind: 'rotated', ...who, pair: { access, refresh } };
}
