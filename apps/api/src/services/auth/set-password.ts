import type { Transaction } from 'sequelize';
import { Credential } from '../../models/credential.ts';

/** Keeps a password hash as the person's only one. */
export async function setPassword(
  transaction: Transaction,
  personId: string,
  passwordHash: string,
): Promise<void> {
  await Credential.upsert({ personId, passwordHash, changedAt: new Date() }, { transaction });
}
