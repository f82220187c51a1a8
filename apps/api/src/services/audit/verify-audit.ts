import type { ResponseOf, verifyAudit as operation } from '@tipward/contract';
import { Op } from 'sequelize';
import { AuditEventRecord } from '../../models/audit-event-record.ts';
import { GENESIS_HASH, linkHolds } from './audit-chain.ts';

const BATCH = 1000;

/** Walks the chain from its first event and recomputes every hash. */
export async function verifyAudit(): Promise<ResponseOf<typeof operation>> {
  let before = { sequence: 0, hash: GENESIS_HASH };
  let events = 0;
  for (;;) {
    const rows = await AuditEventRecord.findAll({
      where: { sequence: { [Op.gt]: before.sequence } },
      order: [['sequence', 'ASC']],
      limit: BATCH,
    });
    for (const row of rows) {
      const { actorId, action, subjectKind, subjectId, programmeId, detail, previousHash, hash, sequence } =
        row;
      const at = row.at.toISOString();
      const link = {
        sequence,
        at,
        actorId,
        action,
        subjectKind,
        subjectId,
        programmeId,
        detail,
        previousHash,
        hash,
      };
      if (!linkHolds(link, before))
        return { holds: false, events, firstBroken: sequence, lastHash: before.hash };
      before = { sequence, hash };
      events += 1;
    }
    if (rows.length < BATCH) return { holds: true, events, firstBroken: null, lastHash: before.hash };
  }
}
