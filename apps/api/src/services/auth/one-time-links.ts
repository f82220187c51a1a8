import { createHash, randomBytes } from 'node:crypto';
import type { Transaction } from 'sequelize';
import type { Context } from '../../context.ts';
import { invalid } from '../../http/app-error.ts';
import { OneTimeLink, type LinkPurpose } from '../../models/one-time-link.ts';

const LIFETIME_MS: Record<LinkPurpose, number> = {
  invitation: 7 * 24 * 3600 * 1000,
  'password-reset': 3600 * 1000,
};
const PATH: Record<LinkPurpose, string> = {
  invitation: '/accept-invitation',
  'password-reset': '/reset-password',
};

const hashOfToken = (token: string): string => createHash('sha256').update(token).digest('hex');

/**
 * A new link for a person; the earlier ones of its purpose end. The token stands in the fragment of the address, which
 * browsers send to no server and no log.
 */
export async function createLink(
  context: Context,
  transaction: Transaction,
  personId: string,
  purpose: LinkPurpose,
): Promise<string> {
  await endLinks(transaction, personId, purpose);
  const token = randomBytes(32).toString('base64url');
  const expiresAt = new Date(Date.now() + LIFETIME_MS[purpose]);
  await OneTimeLink.create({ personId, purpose, tokenHash: hashOfToken(token), expiresAt }, { transaction });
  return `${context.config.publicUrl}${PATH[purpose]}#token=${token}`;
}

export async function endLinks(
  transaction: Transaction,
  personId: string,
  purpose: LinkPurpose,
): Promise<void> {
  await OneTimeLink.update(
    { usedAt: new Date() },
    { where: { personId, purpose, usedAt: null }, transaction },
  );
}

/**
 * Uses a link up and says whose it is. The row is locked: of two requests at once only one gets through.
 * @throws AppError `invalid` when it is unknown, used or expired; which of these is not told
 */
export async function useLink(
  transaction: Transaction,
  token: string,
  purpose: LinkPurpose,
): Promise<string> {
  const link = await OneTimeLink.findOne({
    where: { tokenHash: hashOfToken(token), purpose, usedAt: null },
    lock: transaction.LOCK.UPDATE,
    transaction,
  });
  if (link === null || link.expiresAt.getTime() <= Date.now())
    throw invalid([
      {
        field: 'token',
        value: 'hidden',
        message: 'Link is used or expired; allowed: the link of the latest e-mail',
      },
    ]);
  await link.update({ usedAt: new Date() }, { transaction });
  return link.personId;
}
