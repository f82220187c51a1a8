import type { Transaction } from 'sequelize';
import type { Context } from '../../context.ts';
import { AuditEventRecord } from '../../models/audit-event-record.ts';
import { GENESIS_HASH, hashOf, type AuditLink } from './audit-chain.ts';

export interface Happening {
  readonly actorId: string | null;
  /** 'resource.what-happened', for example 'versions.saved'. */
  readonly action: string;
  readonly subjectKind: string;
  readonly subjectId: string | null;
  readonly programmeId?: string | null;
  /** Plain JSON; never a password, a token or the text of a draft. */
  readonly detail?: Readonly<Record<string, unknown>>;
}

/** Number of the lock that lets one transaction at a time write the next link of the chain. */
const CHAIN_LOCK = 4_817_001;

/**
 * Writes the next link of the audit chain in the transaction of what happened. Call it last: until the transaction
 * ends, others wait here.
 */
export async function writeAudit(
  context: Context,
  transaction: Transaction,
  happening: Happening,
): Promise<void> {
  await context.db.query(`SELECT pg_advisory_xact_lock(${CHAIN_LOCK})`, { transaction });
  const last = await AuditEventRecord.findOne({ order: [['sequence', 'DESC']], transaction });
  const link: Omit<AuditLink, 'hash'> = {
    sequence: (last?.sequence ?? 0) + 1,
    at: new Date().toISOString(),
    actorId: happening.actorId,
    action: happening.action,
    subjectKind: happening.subjectKind,
    subjectId: happening.subjectId,
    programmeId: happening.programmeId ?? null,
    detail: JSON.parse(JSON.stringify(happening.detail ?? {})) as Record<string, unknown>,
    previousHash: last?.hash ?? GENESIS_HASH,
  };
  await AuditEventRecord.create({ ...link, at: new Date(link.at), hash: hashOf(link) }, { transaction });
}
