import type { listAuditEvents as operation, QueryOf, ResponseOf } from '@tipward/contract';
import { Op } from 'sequelize';
import { invalid } from '../../http/app-error.ts';
import { AuditEventRecord } from '../../models/audit-event-record.ts';
import { presentAuditEvent } from '../../presenters/audit-event.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';

type Query = QueryOf<typeof operation>;

/** A cursor is the sequence of the last event seen; the next page holds those before it. */
function readCursor(cursor: string | undefined): number | null {
  if (cursor === undefined) return null;
  if (/^[1-9]\d{0,14}$/u.test(cursor)) return Number(cursor);
  throw invalid([
    {
      field: 'cursor',
      value: cursor.slice(0, 60),
      message: 'is no cursor; allowed: nextCursor of an earlier page',
    },
  ]);
}

/** Events, newest first. */
export async function listAuditEvents(query: Query): Promise<ResponseOf<typeof operation>> {
  const before = readCursor(query.cursor);
  const rows = await AuditEventRecord.findAll({
    where: {
      ...(before === null ? {} : { sequence: { [Op.lt]: before } }),
      ...(query.action === undefined ? {} : { action: query.action }),
      ...(query.actorId === undefined ? {} : { actorId: query.actorId }),
      ...(query.programmeId === undefined ? {} : { programmeId: query.programmeId }),
    },
    order: [['sequence', 'DESC']],
    limit: query.limit + 1,
  });
  const shown = rows.slice(0, query.limit);
  const ref = await loadPersonRefs(shown.flatMap(({ actorId }) => (actorId === null ? [] : [actorId])));
  const last = shown.at(-1);
  return {
    items: shown.map((row) => presentAuditEvent(row, ref)),
    nextCursor: rows.length > query.limit && last !== undefined ? String(last.sequence) : null,
  };
}
